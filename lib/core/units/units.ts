import type { Quantity } from "../tree/schema";

/**
 * Units people read off an instrument, with exact factors [U1]. One table: a
 * unit belongs to one quantity and is `value x factor + offset` in that
 * quantity's base unit. Factors follow from the definitions of the
 * international yard and pound (1959), the SI brochure (9th edition) and
 * NIST SP 811, appendix B; none is rounded.
 */
export type Unit = {
  readonly symbol: string;
  readonly quantity: Quantity;
  readonly title: string;
  readonly factor: number;
  readonly offset: number;
};

const INCH_MM = 25.4;
const POUND_FORCE_N = 0.45359237 * 9.80665;
/** A pound of force on a square inch, in kPa. */
const PSI_KPA = POUND_FORCE_N / (INCH_MM * INCH_MM * 1e-6) / 1000;
/** Conventional millimetre of mercury: 13 595.1 kg/m3 under standard gravity. */
const MMHG_KPA = (13_595.1 * 9.80665 * 1e-3) / 1000;
/** Conventional inch of water: 1 000 kg/m3 under standard gravity. */
const INH2O_KPA = (1000 * 9.80665 * INCH_MM * 1e-3) / 1000;
const US_GALLON_L = (231 * INCH_MM ** 3) / 1e6;
const IMPERIAL_GALLON_L = 4.54609;

const unit = (quantity: Quantity, symbol: string, title: string, factor: number, offset = 0): Unit => ({
  symbol,
  quantity,
  title,
  factor,
  offset,
});

/** The first of each quantity is its base unit. */
const UNITS: readonly Unit[] = [
  unit("pressure", "kPa", "kilopascal", 1),
  unit("pressure", "bar", "bar", 100),
  unit("pressure", "mbar", "millibar", 0.1),
  unit("pressure", "psi", "pound per square inch", PSI_KPA),
  unit("pressure", "inHg", "inch of mercury", MMHG_KPA * INCH_MM),
  unit("pressure", "mmHg", "millimetre of mercury", MMHG_KPA),
  unit("pressure", "inH2O", "inch of water", INH2O_KPA),
  unit("pressure", "mmH2O", "millimetre of water", INH2O_KPA / INCH_MM),
  unit("pressure", "MPa", "megapascal", 1000),
  unit("pressure", "kgf/cm2", "kilogram-force per square centimetre", 98.0665),
  unit("temperature", "C", "degree Celsius", 1),
  unit("temperature", "F", "degree Fahrenheit", 5 / 9, -160 / 9),
  // A drop or a rise: the size of the degree alone, no offset.
  unit("temperature-difference", "K", "kelvin", 1),
  unit("temperature-difference", "C-diff", "degree Celsius of difference", 1),
  unit("temperature-difference", "F-diff", "degree Fahrenheit of difference", 5 / 9),
  unit("voltage", "V", "volt", 1),
  unit("voltage", "mV", "millivolt", 0.001),
  unit("current", "A", "ampere", 1),
  unit("current", "mA", "milliampere", 0.001),
  unit("resistance", "ohm", "ohm", 1),
  unit("resistance", "mohm", "milliohm", 0.001),
  unit("speed", "rpm", "turns a minute", 1),
  unit("time", "s", "second", 1),
  unit("time", "min", "minute", 60),
  unit("volume", "L", "litre", 1),
  unit("volume", "ml", "millilitre", 0.001),
  unit("volume", "gal-us", "US gallon", US_GALLON_L),
  unit("volume", "gal-imp", "imperial gallon", IMPERIAL_GALLON_L),
  unit("flow", "L/min", "litre a minute", 1),
  unit("flow", "ml/min", "millilitre a minute", 0.001),
  unit("flow", "L/h", "litre an hour", 1 / 60),
  unit("flow", "gal-us/h", "US gallon an hour", US_GALLON_L / 60),
  unit("length", "mm", "millimetre", 1),
  unit("length", "in", "inch", INCH_MM),
  unit("ratio", "%", "per cent", 1),
  unit("concentration", "ppm", "parts in a million", 1),
  unit("concentration", "mg/kg", "milligram a kilogram", 1),
  unit("concentration", "%-weight", "per cent of the weight", 10_000),
  unit("density", "g/ml", "gram a millilitre", 1),
  unit("density", "SG", "specific gravity", 1),
  unit("count", "count", "how many", 1),
];

const BY_SYMBOL = new Map(UNITS.map((one) => [one.symbol, one]));

/** Other ways to write a unit; the first spelling in the table is the one stored. */
const SPELLINGS: Readonly<Record<string, string>> = {
  "°C": "C",
  degC: "C",
  "°F": "F",
  degF: "F",
  l: "L",
  "l/min": "L/min",
  "l/h": "L/h",
  Ω: "ohm",
  mΩ: "mohm",
  "kg/L": "g/ml",
  "1/min": "rpm",
  times: "count",
};

/** A unit that the table does not have, or one of another quantity. The message can be shown. */
export class UnitRefused extends Error {
  override readonly name = "UnitRefused";
}

/** The unit behind a symbol, or null. */
export const findUnit = (symbol: string): Unit | null => BY_SYMBOL.get(symbol) ?? BY_SYMBOL.get(SPELLINGS[symbol] ?? "") ?? null;

/** Units in which a quantity may be typed, the base unit first. */
export const unitsOf = (quantity: Quantity): readonly Unit[] => UNITS.filter((one) => one.quantity === quantity);

const unitOrRefuse = (symbol: string): Unit => {
  const found = findUnit(symbol);
  if (!found) throw new UnitRefused(`"${symbol}" is not a unit known here`);
  return found;
};

/**
 * A value in one unit, said in another. Rules [U1], [U2].
 *
 * @throws UnitRefused when a unit is unknown or the two measure different things.
 */
export function convert(value: number, from: string, to: string): number {
  const source = unitOrRefuse(from);
  const target = unitOrRefuse(to);
  if (source.quantity !== target.quantity)
    throw new UnitRefused(`"${from}" measures ${source.quantity}, "${to}" measures ${target.quantity}`);
  if (source === target) return value;
  return (value * source.factor + source.offset - target.offset) / target.factor;
}
