"use client";

import { useGuard } from "@/lib/client/screen/use-guard";
import { AnswerButton } from "./answer-button";
import { useHere } from "./here";

/** Steps that two phones answered at once: one tap says which answer is right. */
export function Conflicts() {
  const { view, record, ready } = useHere();
  const guard = useGuard();
  return (
    <>
      {view.conflicts.map((conflict) => (
        <section key={conflict.step} aria-label={conflict.title} className="mt-4 rounded-xl border-[1.5px] border-buoy bg-buoy-wash p-3.5">
          <h2 className="text-lg">{conflict.title}</h2>
          <p className="mt-1 mb-2 text-sm">Two phones say different things. Which is right?</p>
          <div className="grid gap-2">
            {conflict.answers.map((answer) => (
              <AnswerButton key={answer.event} onTap={() => guard("pick", () => void record("picked", { event: answer.event }))}>
                {answer.says}
                <span className="block text-sm font-normal text-ink-2">
                  {answer.device === ready.store.device ? "from this phone" : "from another phone"}
                </span>
              </AnswerButton>
            ))}
          </div>
        </section>
      ))}
    </>
  );
}
