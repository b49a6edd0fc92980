import type { HandOverFacts } from "@/lib/client/hand-over/facts";
import { radioWords } from "@/lib/client/hand-over/radio-words";

/** What to read out, a line a breath. */
export function HandOverRadio({ facts }: { facts: HandOverFacts }) {
  return (
    <section aria-labelledby="radio" className="break-inside-avoid rounded-xl border-[1.5px] border-edge bg-sheet p-3.5">
      <h2 id="radio" className="text-lg">
        To read out over the radio
      </h2>
      <p className="mt-1 text-sm text-ink-2">
        Losing ground towards danger: say PAN PAN three times first, on VHF 16. Life in grave danger: MAYDAY three times. Otherwise call the
        nearest coast station or marina.
      </p>
      <ol className="mt-2 grid gap-2">
        {radioWords(facts).map((line) => (
          <li key={line} className="text-lg">
            {line}
          </li>
        ))}
      </ol>
    </section>
  );
}
