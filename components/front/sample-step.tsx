import { CautionPanel } from "@/components/ui/caution-panel";

const POSSIBLE = [
  { title: "Primary filter blocked", of100: 46, look: "bg-fill" },
  { title: "Pick-up in the tank blocked", of100: 21, look: "hatched" },
  { title: "Eleven others", of100: 27, look: "bg-shoal shadow-[inset_0_0_0_1px_var(--edge)]" },
  { title: "Something not in this tree", of100: 6, look: "bg-sheet shadow-[inset_0_0_0_1px_var(--edge)]" },
];

/** What one step looks like, drawn for people who have not been here. Its figures are an example and say so. */
export function SampleStep() {
  return (
    <figure className="self-start">
      <div className="overflow-hidden rounded-2xl border-[1.5px] border-edge bg-paper">
        <div className="bg-deep px-4 py-3 text-on-deep">
          <p className="font-semibold">Main engine, at anchor</p>
          <p className="text-sm opacity-85">Will not reach full revs</p>
        </div>
        <div className="grid gap-3 px-4 py-4">
          <p className="border-l-4 border-fill pl-2.5 text-sm text-ink-2">
            Tells the two likeliest causes apart in three minutes. Nothing has to be opened.
          </p>
          <p className="text-xl font-bold">Look into the bowl under the primary filter</p>
          <CautionPanel signal="warning">Spilt fuel burns on hot metal. Stop the engine and let it cool.</CautionPanel>
          <ol className="list-decimal pl-6 text-sm marker:text-fill">
            <li>Shine a torch through the bowl from behind.</li>
            <li>Look for a line where fuel sits on water.</li>
          </ol>
          <div className="grid gap-2" aria-hidden>
            {["Clear, bright fuel", "Water under the fuel", "Can’t tell, or can’t get to it"].map((answer, i) => (
              <span
                key={answer}
                className={`rounded-lg border-[1.5px] border-edge px-3 py-2.5 text-sm font-semibold ${i < 2 ? "bg-sheet" : "border-dashed text-ink-2"}`}
              >
                {answer}
              </span>
            ))}
          </div>
        </div>
        <div className="border-t border-rule bg-sheet px-4 py-3">
          <p className="flex justify-between text-sm text-ink-2">
            <b>Still possible</b> <span>of 100 engines like this</span>
          </p>
          <ul className="mt-1 text-sm">
            {POSSIBLE.map((p) => (
              <li key={p.title} className="flex items-center gap-2 py-0.5">
                <span aria-hidden className={`size-3.5 flex-none rounded-xs ${p.look}`} />
                <span className="flex-1">{p.title}</span>
                <span className="dial">{p.of100}</span>
              </li>
            ))}
          </ul>
        </div>
      </div>
      <figcaption className="mt-2 text-sm text-ink-2">One step, as the skipper sees it. The figures are an example.</figcaption>
    </figure>
  );
}
