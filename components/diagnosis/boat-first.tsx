import { Button } from "@/components/ui/button";

type Props = { safe: boolean; onSafe: (safe: boolean) => void; /** To the page that helps whoever comes. */ onCall: () => void };

/** Under way the boat comes before the engine. */
export function BoatFirst({ safe, onSafe, onCall }: Props) {
  if (safe)
    return (
      <p className="mt-3 flex flex-wrap items-center gap-x-3 text-sm">
        <span>The boat is safe for now. Somebody keeps a look-out while you are below.</span>
        <button type="button" className="link min-h-12" onClick={() => onSafe(false)}>
          Show what to do first
        </button>
      </p>
    );
  return (
    <section aria-labelledby="boat-first" className="mt-3 rounded-xl border-[1.5px] border-lead bg-lead-wash px-4 py-3">
      <h2 id="boat-first">The boat first, then the engine</h2>
      <ol className="mt-2 list-decimal pl-6 marker:font-bold">
        <li>Is everyone well, and nobody near the shaft or the belts?</li>
        <li>Get steerage: sail up, or turn away from land and traffic while there is way on.</li>
        <li>Not enough room? Anchor, even in deep water. Let out what you have.</li>
        <li>Losing ground towards danger? Call now, before looking at the engine: PAN PAN on VHF 16, MAYDAY if life is in grave danger.</li>
        <li>Show the signals of a vessel not under command, and keep a look-out.</li>
      </ol>
      <div className="mt-3 grid gap-3">
        <Button tone="strong" size="large" wide onClick={() => onSafe(true)}>
          The boat is safe for now
        </Button>
        <Button size="large" wide onClick={onCall}>
          Call for help: what to say
        </Button>
      </div>
    </section>
  );
}
