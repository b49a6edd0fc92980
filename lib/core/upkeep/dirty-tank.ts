import type { GammaRate } from "../statistics/gamma-poisson";

/**
 * A tank that dirties filters. `litres`: what is in it, until it is burnt through and clean fuel follows. `seen`: elements clogged
 * over litres burnt so far, where anyone counted.
 */
export type DirtyTank = { readonly litres: number; readonly seen?: { readonly elements: number; readonly litres: number } | undefined };

/** Where nobody counted: an element in fifty litres, worth one element of evidence. Judgement. */
const USUAL = { elements: 1, litres: 50 };

/** How much of what the first filter catches goes on to clog the second, and the third; each new element takes its seals. Judgement. */
export const PASSED_ON: Readonly<Record<string, number>> = {
  "primary-element": 1,
  "primary-seals": 1,
  "secondary-element": 0.25,
  "secondary-seals": 0.25,
  "third-element": 0.1,
};

/** Elements a litre of dirty fuel, as a gamma distribution: what is usual, outweighed by what was seen (rule P4). */
export const elementsPerLitre = ({ seen }: DirtyTank): GammaRate => ({
  events: USUAL.elements + (seen?.elements ?? 0),
  exposure: USUAL.litres + (seen?.litres ?? 0),
});

/** The litres that are dirty of those to be burnt: no more than the tank holds now. */
export const dirtyLitres = (tank: DirtyTank, litresToBurn: number): number => Math.min(tank.litres, litresToBurn);
