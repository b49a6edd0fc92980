"use client";

import { useState } from "react";
import { durationInWords, minutesBetween } from "@/lib/client/duration";
import { SITUATIONS, type Position } from "@/lib/client/hand-over/facts";
import { gatherHandOver } from "@/lib/client/hand-over/gather";
import { positionInFigures } from "@/lib/client/hand-over/position";
import { useNow } from "@/lib/client/screen/use-now";
import { Button } from "@/components/ui/button";
import { BackLink } from "./back-link";
import { Defers } from "./defers";
import { HandOverMessage } from "./hand-over-message";
import { HandOverPosition } from "./hand-over-position";
import { HandOverRadio } from "./hand-over-radio";
import { useHere } from "./here";
import { ScreenHeading } from "./screen-heading";

/** One page for whoever comes to help: to show, print, send or read out. */
export function HandOver() {
  const { engine, tree, view, summary, go, record } = useHere();
  const [position, setPosition] = useState<Position | null>(null);
  const now = useNow(60);
  const minutes = minutesBetween(summary.beganAt, now || summary.touchedAt);
  const facts = gatherHandOver({ engine, tree, view, complaint: summary.complaint, minutes, position });
  return (
    <>
      <BackLink />
      <ScreenHeading of="hand-over">
        {facts.boat}, {facts.engine}: hand-over
      </ScreenHeading>
      <p className="mt-1 text-sm text-ink-2">
        {now ? new Date(now).toLocaleString("en-GB", { dateStyle: "medium", timeStyle: "short" }) : ""} &middot;{" "}
        {SITUATIONS[facts.situation]} &middot; {durationInWords(minutes)} so far
      </p>
      <div className="mt-3 grid gap-4">
        <Part
          title="Complaint"
          lines={[...facts.symptoms, ...(facts.complaint ? [`\u201c${facts.complaint}\u201d`] : [])]}
          none="None given."
        />
        {facts.rulesInForce.length > 0 && (
          <Part
            title="Stop rules in force"
            lines={view.rulesInForce.map((rule) => `${rule.title}: ${rule.says[0] ?? rule.because}`)}
            none=""
          />
        )}
        <Part
          title="Engine"
          lines={[...facts.engineIs, ...(facts.hours === null ? [] : [`${facts.hours} h at the last reading`])]}
          none="Nothing is known of its make and fittings."
        />
        {facts.position && <Part title="Position" lines={[positionInFigures(facts.position)]} none="" />}
        <Part title="Looked at" lines={facts.checked.map(({ title, says }) => `${title}: ${says}`)} none="Nothing yet." />
        <Part title="Tried" lines={facts.tried.map(({ title, says }) => `${title}: ${says}`)} none="Nothing yet." />
        <Part
          title="Still possible, of 100 engines like this"
          lines={[
            ...facts.possible.slice(0, 6).map(({ title, of100 }) => `${of100}: ${title}`),
            `${view.possible.unknown.of100}: something not in this tree`,
          ]}
          none=""
        />
        {facts.crankSeconds > 0 && <Part title="Cranked since it last ran" lines={[`${Math.round(facts.crankSeconds)} s`]} none="" />}
      </div>
      <div className="no-print mt-5 grid gap-5">
        <HandOverPosition position={position} onPosition={setPosition} />
        <HandOverMessage facts={facts} />
        <HandOverRadio facts={facts} />
        <Button size="large" wide onClick={() => window.print()}>
          Print this page
        </Button>
        {!view.outcome && (
          <Button
            tone="strong"
            size="large"
            wide
            onClick={() =>
              void record("ended", { outcome: "handed-over", minutes: Math.round(minutes), parts: [] }).then(() => go("ended"))
            }
          >
            Help was called: log it as handed over
          </Button>
        )}
      </div>
      <Defers />
    </>
  );
}

function Part({ title, lines, none }: { title: string; lines: readonly string[]; none: string }) {
  return (
    <section aria-label={title} className="break-inside-avoid">
      <h2 className="text-base">{title}</h2>
      {lines.length === 0 ? (
        <p className="text-ink-2">{none}</p>
      ) : (
        <ul className="list-disc pl-5">
          {lines.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      )}
    </section>
  );
}
