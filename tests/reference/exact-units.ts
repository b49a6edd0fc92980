/**
 * Units by their definitions, written anew and not taken from lib/core/units,
 * so that a slip there cannot hide one in the tree. Definitions: international
 * inch 25.4 mm, pound 0.453 592 37 kg (1959); standard gravity 9.806 65 m/s2;
 * conventional water 1 000 kg/m3 and mercury 13 595.1 kg/m3; 0 degC = 32 degF.
 */
const G = 9.80665;
const INCH_M = 0.0254;
const PASCALS: Readonly<Record<string, number>> = {
  kPa: 1e3,
  MPa: 1e6,
  bar: 1e5,
  psi: (0.45359237 * G) / INCH_M ** 2,
  inHg: 13_595.1 * G * INCH_M,
  inH2O: 1000 * G * INCH_M,
};

const toBase = (value: number, unit: string): { value: number; base: string } => {
  const pascals = PASCALS[unit];
  if (pascals !== undefined) return { value: value * pascals, base: "Pa" };
  if (unit === "in") return { value: value * INCH_M * 1000, base: "mm" };
  if (unit === "K" || unit === "C-diff") return { value, base: "degrees of difference" };
  if (unit === "F-diff") return { value: (value * 5) / 9, base: "degrees of difference" };
  if (unit === "F") return { value: ((value - 32) * 5) / 9, base: "°C" };
  return { value, base: unit };
};

export function inUnit(value: number, from: string, to: string): number {
  const source = toBase(value, from);
  const target = toBase(1, to);
  if (source.base !== target.base) throw new Error(`${from} is not ${to}`);
  return source.value / (target.base === "°C" ? 1 : target.value);
}
