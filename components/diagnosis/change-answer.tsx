"use client";

import type { ReactNode } from "react";
import { checkShown } from "@/lib/client/check-shown";
import { AnswerForm } from "./answer-form";
import { BackLink } from "./back-link";
import { useHere } from "./here";
import { RemedyResultForm } from "./remedy-result-form";
import { ScreenHeading } from "./screen-heading";

/** Another answer in the place of one that was given. */
export function ChangeAnswer() {
  const { address, events, tree, view, record, go } = useHere();
  const event = events.find((kept) => kept.event.id === address.which)?.event;
  const said = view.said.find((one) => one.event === address.which);
  const done = () => go("said", undefined, "replace");
  if (event?.kind === "answered") {
    const check = tree.checks.find(({ key }) => key === event.payload.check);
    if (check) {
      const shown = checkShown(tree, check, view.profile);
      return (
        <Changing title={check.title} was={said?.says}>
          <AnswerForm
            of={check.key}
            ask={check.ask}
            answers={shown.answers}
            reading={shown.reading}
            ifFitted={false}
            onAnswer={async ({ answer, note, photos }) => {
              const kept = note || event.payload.note;
              await record(
                "answered",
                { check: check.key, answer, ...(kept ? { note: kept } : {}), photos: [...event.payload.photos, ...photos].slice(0, 12) },
                event.id,
              );
              done();
            }}
          />
        </Changing>
      );
    }
  }
  if (event?.kind === "remedy-tried") {
    const remedy = tree.remedies.find(({ key }) => key === event.payload.remedy);
    return (
      <Changing title={remedy?.title ?? event.payload.remedy} was={said?.says}>
        <RemedyResultForm
          of={event.payload.remedy}
          proof={remedy?.proof ?? null}
          onResult={async ({ result, proof, note, photos }) => {
            const kept = note || event.payload.note;
            await record(
              "remedy-tried",
              {
                remedy: event.payload.remedy,
                result,
                ...(proof ? { proof } : {}),
                ...(kept ? { note: kept } : {}),
                photos: [...event.payload.photos, ...photos].slice(0, 12),
              },
              event.id,
            );
            done();
          }}
        />
      </Changing>
    );
  }
  return (
    <>
      <BackLink />
      <ScreenHeading of="change">This answer is not here any more</ScreenHeading>
    </>
  );
}

function Changing({ title, was, children }: { title: string; was: string | undefined; children: ReactNode }) {
  return (
    <>
      <BackLink />
      <ScreenHeading of={title}>{title}</ScreenHeading>
      {was && <p className="mt-2 text-ink-2">The answer was: {was}.</p>}
      {children}
    </>
  );
}
