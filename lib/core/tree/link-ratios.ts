import { causeRow } from "../diagnosis/cause-row";
import { soundRow } from "../diagnosis/sound-row";
import type { FaultTree } from "./schema";

/** How far one finding speaks for a cause: seen so often with it, so often on a sound engine, and the ratio of the two. */
export type LinkRatio = { cause: string; check: string; finding: string; withCause: number; sound: number; ratio: number };

/** Every linked check of every cause, finding by finding. Links to checks the tree does not have are left out. */
export function linkRatios(tree: Pick<FaultTree, "causes" | "checks">): LinkRatio[] {
  const checks = new Map(tree.checks.map((check) => [check.key, { check, sound: soundRow(check) }]));
  return tree.causes.flatMap((cause) =>
    Object.entries(cause.gives).flatMap(([key, links]) => {
      const entry = checks.get(key);
      if (entry === undefined) return [];
      const row = causeRow(entry.check, links, entry.sound);
      return entry.check.findings.map((finding, index) => {
        const [withCause = 0, sound = 0] = [row[index], entry.sound[index]];
        return { cause: cause.key, check: key, finding: finding.key, withCause, sound, ratio: sound === 0 ? Infinity : withCause / sound };
      });
    }),
  );
}
