"use client";

import type { ReactNode } from "react";
import { durationInWords, minutesBetween } from "@/lib/client/duration";
import { useNow } from "@/lib/client/screen/use-now";
import { Frame } from "./frame";
import { useHere } from "./here";
import { StillPossible } from "./still-possible";

const WITH_POSSIBLE = new Set(["step", "rules", "looked", "tried", "change", "answered"]);

/** The band over every screen of a diagnosis: engine, complaint, answers given, minutes so far. */
export function DiagnosisFrame({ children }: { children: ReactNode }) {
  const { ready, engine, view, summary, address, go } = useHere();
  const now = useNow();
  const present = view.symptoms.filter((symptom) => symptom.present).map(({ title }) => title);
  const until = view.outcome?.at ?? now;
  const minutes = until === 0 ? null : minutesBetween(summary.beganAt, until);
  const given = view.said.filter(({ kind }) => kind === "answered" || kind === "remedy-tried").length;
  return (
    <Frame
      ready={ready}
      who={`${engine.boatName}, ${engine.name}`}
      under={present.join(" · ") || summary.complaint || "No symptom given"}
      line={
        <>
          <a
            href={`/diagnose?d=${summary.id}&at=said`}
            className="inline-flex min-h-12 items-center underline underline-offset-4"
            onClick={(event) => {
              event.preventDefault();
              go("said");
            }}
          >
            {given === 1 ? "1 answer given" : `${given} answers given`}
          </a>
          {address.at !== "hand-over" && (
            <a
              href={`/diagnose?d=${summary.id}&at=hand-over`}
              className="inline-flex min-h-12 items-center font-semibold underline underline-offset-4"
              onClick={(event) => {
                event.preventDefault();
                go("hand-over");
              }}
            >
              Call for help
            </a>
          )}
          <span className="ml-auto">
            {minutes === null ? "" : durationInWords(minutes)}
            <span className="visually-hidden"> so far</span>
          </span>
        </>
      }
      aside={WITH_POSSIBLE.has(address.at) ? <StillPossible /> : undefined}
    >
      {children}
    </Frame>
  );
}
