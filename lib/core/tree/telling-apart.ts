import { causeRow } from "../diagnosis/cause-row";
import { soundRow } from "../diagnosis/sound-row";
import { fits } from "./engine-kinds";
import type { Rivals } from "./rivals";
import type { Cause, Check, FaultTree } from "./schema";
import { STRENGTHS } from "./strength";
import { treatedAsRail } from "./treated-as-rail";

/** A finding tells when it is seen so many times as often with the one as with the other, cause or sound engine. */
export const TELLING = 4;
/** ... and often enough to be waited for: one seen less than "sometimes" hardly ever decides. */
const SEEN = STRENGTHS.sometimes;

/** A finding that speaks for one cause against another. */
type Telling = { check: Check; finding: Check["findings"][number] };

/** Has the first cause a finding that tells it from the second, by a check that can be made where they are rivals? */
export type TellsApart = (one: Cause, other: Cause, where: Pick<Rivals, "symptom" | "kind">) => boolean;

/** Looks a tree's links up once, so that many pairs can be asked about. Links to checks the tree does not have are left out. */
export function tellingApart(tree: Pick<FaultTree, "causes" | "checks">): TellsApart {
  const checks = new Map(tree.checks.map((check) => [check.key, { check, sound: soundRow(check) }]));
  const rows = new Map(
    tree.causes.map((cause) => [
      cause,
      new Map(
        Object.entries(cause.gives).flatMap(([key, links]) => {
          const entry = checks.get(key);
          return entry === undefined ? [] : [[key, causeRow(entry.check, links, entry.sound)] as const];
        }),
      ),
    ]),
  );
  const tellings = new Map<Cause, Map<Cause, Telling[]>>();

  const look = (one: Cause, other: Cause): Telling[] =>
    [...new Set([...Object.keys(one.gives), ...Object.keys(other.gives)])].flatMap((key) => {
      const entry = checks.get(key);
      if (entry === undefined) return [];
      const [mine, its] = [rows.get(one)?.get(key) ?? entry.sound, rows.get(other)?.get(key) ?? entry.sound];
      return entry.check.findings
        .filter((_, index) => (mine[index] ?? 0) >= SEEN - 1e-9 && (mine[index] ?? 0) >= TELLING * (its[index] ?? 0))
        .map((finding) => ({ check: entry.check, finding }));
    });

  return (one, other, { symptom, kind }) => {
    const ofOne = tellings.get(one) ?? new Map<Cause, Telling[]>();
    tellings.set(one, ofOne);
    const found = ofOne.get(other) ?? look(one, other);
    ofOne.set(other, found);
    return found.some((telling) => counts(telling, symptom) && canBeMade(telling.check, symptom, kind));
  };
}

/** What only says the symptom again weighs nothing. Rule [E4]. */
const counts = ({ check, finding }: Telling, symptom: Rivals["symptom"]): boolean =>
  finding.restates !== symptom.key || check.findings.filter(({ restates }) => restates === symptom.key).length > 1;

/** The engine has the parts, the symptom leaves the engine state that the check needs, and no rail is opened. */
const canBeMade = (check: Check, symptom: Rivals["symptom"], kind: Rivals["kind"]): boolean =>
  fits(check, kind) && !symptom.rulesOut?.includes(check.engine) && !(check.flags.opensHighPressureFuel && treatedAsRail(kind));
