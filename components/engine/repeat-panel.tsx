import type { RepeatEvidence } from "@/lib/core/contract/repeat-evidence";
import type { RepeatFault } from "@/lib/core/contract/log";
import { repeatInWords, wholeNumber } from "./repeat-in-words";

/** A fault that came back: the fact, its gaps as a picture and in words, and what lies upstream. */
export function RepeatPanel({ repeat, evidence }: { repeat: RepeatFault; evidence?: RepeatEvidence | undefined }) {
  const inHours = repeat.gapsHours.length > 0;
  const gaps = inHours ? repeat.gapsHours : repeat.gapsDays;
  const unit = inHours ? "h" : "d";
  return (
    <section className="grid gap-5 rounded-xl border-[1.5px] border-lead bg-linear-to-r from-lead-wash to-sheet px-4 py-4 sm:px-5 md:grid-cols-[1fr_20rem]">
      <div>
        <p className="text-sm font-bold text-lead">{evidence?.trend === "getting-worse" ? "Getting worse" : "Came back"}</p>
        <h2>{repeatInWords(repeat)}</h2>
        <p className="mt-1.5">
          {inHours ? "Running hours" : "Days"} between them: {gaps.map((g) => wholeNumber(g)).join(", ")}.{" "}
          {repeat.unprovedBefore > 0 && `${wholeNumber(repeat.unprovedBefore)} of the cures before had not been proved. `}
          {!evidence && gaps.length < 3 ? "Too few to tell whether it is getting worse." : ""}
        </p>
        {evidence && (
          <ul className="mt-1.5 list-disc pl-5">
            {evidence.words.slice(1).map((words) => (
              <li key={words}>{words}</li>
            ))}
          </ul>
        )}
        {repeat.upstream.length > 0 && (
          <p className="mt-1.5">
            Putting this right cures the symptom, not what brings it on. Look upstream at{" "}
            {repeat.upstream.map((u, i) => (
              <span key={u.title}>
                {i > 0 && (i === repeat.upstream.length - 1 ? " or " : ", ")}
                <b>{lower(u.title)}</b>
              </span>
            ))}
            .
          </p>
        )}
      </div>
      <GapBars gaps={gaps} unit={unit} />
    </section>
  );
}

/** Bars as high as the gaps are long; the figures stand under them, so the picture adds nothing a reader would miss. */
function GapBars({ gaps, unit }: { gaps: readonly number[]; unit: "h" | "d" }) {
  const shown = gaps.slice(-8);
  const longest = Math.max(...shown, 1);
  return (
    <figure>
      <div className="flex h-24 items-end gap-2" aria-hidden>
        {shown.map((gap, i) => (
          <div key={i} className="flex h-full flex-1 flex-col justify-end text-center">
            <svg className="w-full flex-1" viewBox="0 0 10 100" preserveAspectRatio="none">
              <rect
                x={0}
                y={100 - Math.max(4, (gap / longest) * 100)}
                width={10}
                height={Math.max(4, (gap / longest) * 100)}
                fill="var(--lead)"
              />
            </svg>
            <span className="text-sm text-ink-2">{wholeNumber(gap)}</span>
          </div>
        ))}
      </div>
      <figcaption className="mt-1 text-center text-sm text-ink-2">
        {unit === "h" ? "running hours" : "days"} from one to the next
      </figcaption>
    </figure>
  );
}

const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);
