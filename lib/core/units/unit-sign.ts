const SIGNS: Readonly<Record<string, string>> = {
  C: "\u00b0C",
  F: "\u00b0F",
  "C-diff": "\u00b0C",
  "F-diff": "\u00b0F",
  "%-weight": "%",
  ohm: "\u03a9",
  mohm: "m\u03a9",
  count: "how many",
  "gal-us": "US gal",
  "gal-imp": "imp gal",
  "gal-us/h": "US gal/h",
  inH2O: "inH\u2082O",
  mmH2O: "mmH\u2082O",
  "kgf/cm2": "kgf/cm\u00b2",
};

/** A unit as it is written beside a figure. */
export const unitSign = (symbol: string): string => SIGNS[symbol] ?? symbol;
