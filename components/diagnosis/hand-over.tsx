"use client";

import { useState } from "react";
import { durationInWords, minutesBetween } from "@/lib/client/duration";
import { SITUATIONS, type Position } from "@/lib/client/hand-over/facts";
import { gatherHandOver } from "@/lib/client/hand-over/gather";
import { positionInFigures } from "@/lib/client/hand-over/position";
import { saidTogether } from "@/lib/client/said-together";
import { useNow } from "@/lib/client/screen/use-now";
import { Button } from "@/components/ui/button";
import { BackLink } from "./back-link";
import { Defers } from "./defers";
import { HandOverMessage } from "./hand-over-message";
import { HandOverPosition } from "./hand-over-position";
import { HandOverRadio } from "./hand-over-radio";
import { useHere } from "./here";
import { HandOverPart } from "./hand-over-part";
import { Photo } from "./photo";
import { ScreenHeading } from "./screen-heading";

/** One page for whoever comes to help: to show, print, send or read out. */
export function HandOver() {
  const { engine, tree, view, summary, go, record, phone, ready } = useHere();
  const [position, setPosition] = useState<Position | null>(null);
  const now = useNow(60);
  const minutes = minutesBetween(summary.beganAt, now || summary.touchedAt);
  const facts = gatherHandOver({
    engine,
    tree,
    view,
    fleet: phone.fleet.name,
    by: ready.person.name,
    complaint: summary.complaint,
    minutes,
    position,
  });
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
      <p className="text-sm text-ink-2">
        {facts.fleet}. Handed over by {facts.by}.
      </p>
      <div className="mt-3 grid gap-4">
        <HandOverPart
          title="Complaint"
          lines={[...facts.symptoms, ...(facts.complaint ? [`\u201c${facts.complaint}\u201d`] : [])]}
          none="None given."
        />
        {facts.rulesInForce.length > 0 && (
          <HandOverPart title="Stop rules in force" lines={facts.rulesInForce.map(({ title, says }) => `${title}. ${says}`)} none="" />
        )}
        <HandOverPart
          title="Engine"
          lines={[...facts.engineIs, ...(facts.hours === null ? [] : [facts.hours])]}
          none="Nothing is known of its make and fittings."
        />
        {facts.position && <HandOverPart title="Position" lines={[positionInFigures(facts.position)]} none="" />}
        <HandOverPart title="Found" lines={facts.checked.map(({ title, says }) => saidTogether(title, says))} none="Nothing yet." />
        {facts.notSeen.length > 0 && <HandOverPart title="Could not be looked at" lines={[facts.notSeen.join("; ")]} none="" />}
        <HandOverPart title="Tried" lines={facts.tried.map(({ title, says }) => saidTogether(title, says))} none="Nothing yet." />
        <HandOverPart
          title="Still possible, of 100 engines like this"
          lines={[
            ...facts.possible.slice(0, 6).map(({ title, of100 }) => `${of100}: ${title}`),
            `${view.possible.unknown.of100}: something not in this tree`,
          ]}
          none=""
        />
        {facts.notes.length > 0 && (
          <HandOverPart title="Notes" lines={facts.notes.map(({ title, says }) => `${title}: \u201c${says}\u201d`)} none="" />
        )}
        {facts.photos.length > 0 && (
          <section aria-label="Photos" className="break-inside-avoid">
            <h2 className="text-base">Photos</h2>
            <ul className="mt-1 flex flex-wrap gap-3">
              {facts.photos.map(({ id, title }, at) => (
                <li key={id} className="max-w-40 text-sm">
                  <Photo id={id} number={at + 1} />
                  {at + 1}: {title}
                </li>
              ))}
            </ul>
          </section>
        )}
        {facts.crankSeconds > 0 && (
          <HandOverPart title="Cranked since it last ran" lines={[`${Math.round(facts.crankSeconds)} s`]} none="" />
        )}
      </div>
      <div className="mt-5 grid gap-5">
        <div className="no-print">
          <HandOverPosition position={position} onPosition={setPosition} />
        </div>
        <HandOverMessage facts={facts} />
        <HandOverRadio facts={facts} />
      </div>
      <div className="no-print mt-5 grid gap-5">
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
