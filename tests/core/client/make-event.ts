import type { DiagnosisEvent, EventKind, EventOf } from "@/lib/core/contract/event";

const id = (n: number) => `0193ec00-0000-7000-8000-${String(n).padStart(12, "0")}`;

/** An event with everything but what a test is about filled in. */
export function makeEvent<K extends EventKind>(
  kind: K,
  payload: EventOf<K>["payload"],
  at: { n: number; diagnosis?: number; device?: number; sequence?: number; minute?: number; supersedes?: number },
): DiagnosisEvent {
  return {
    id: id(at.n),
    diagnosisId: id(9000 + (at.diagnosis ?? 1)),
    device: id(8000 + (at.device ?? 1)),
    sequence: at.sequence ?? at.n,
    madeAt: new Date(Date.UTC(2026, 5, 1, 8, at.minute ?? at.n)).toISOString(),
    seen: {},
    kind,
    payload,
    ...(at.supersedes === undefined ? {} : { supersedes: id(at.supersedes) }),
  } as DiagnosisEvent;
}

export const idOf = id;

export const BEGUN: EventOf<"begun">["payload"] = {
  engineId: id(1),
  treeVersionId: id(2),
  profile: { features: {}, figures: {}, healthy: {} },
  situation: "at-anchor",
  person: "skipper-at-sea",
  symptoms: ["lost-top-end-rpm"],
  complaint: "wont rev",
  multipliers: [],
  coreVersion: 1,
};
