import * as z from "zod";
import type { Lines } from "@/components/form/stale-notice";
import { asTyped, typedNumber } from "@/components/form/typed-number";
import type { Boat, BoatChange } from "@/lib/core/contract/engine";

const minutes = typedNumber({ from: 1, to: 100_000 });

/** A boat as its form holds it; parsing gives what the server takes. */
export const BoatValues = z
  .object({
    name: z.string().trim().min(1, "Give the boat a name.").max(80, "Keep it under 80 characters."),
    alongside: minutes,
    atAnchor: minutes,
    underWay: minutes,
  })
  .transform(({ name, alongside, atAnchor, underWay }): Required<BoatChange> => ({
    name,
    callMinutes: {
      ...(alongside === null ? {} : { alongside }),
      ...(atAnchor === null ? {} : { atAnchor }),
      ...(underWay === null ? {} : { underWay }),
    },
  }));
export type BoatValues = z.input<typeof BoatValues>;

export const boatValues = (boat: Pick<Boat, "name" | "callMinutes"> | null): BoatValues => ({
  name: boat?.name ?? "",
  alongside: asTyped(boat?.callMinutes.alongside),
  atAnchor: asTyped(boat?.callMinutes.atAnchor),
  underWay: asTyped(boat?.callMinutes.underWay),
});

export function boatLines(values: BoatValues): Lines {
  const call = (typed: string) => (typed.trim() === "" ? "as usual" : `${typed.trim()} min`);
  return {
    Name: values.name,
    "Help alongside": call(values.alongside),
    "Help at anchor": call(values.atAnchor),
    "Help under way": call(values.underWay),
  };
}
