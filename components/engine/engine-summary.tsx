import type { Engine } from "@/lib/core/contract/engine";
import type { Feature } from "@/lib/core/tree/schema";
import { Hours } from "./hours";
import { profileInWords } from "./profile-in-words";

/** One line under the engine's name: what it is, and its hours. */
export function EngineSummary({ engine, features }: { engine: Engine; features: readonly Feature[] }) {
  const words = profileInWords(engine.profile, features);
  return (
    <>
      {words || "Nothing is known about it yet; the profile can be filled in when you know more"} · <Hours engine={engine} />
    </>
  );
}
