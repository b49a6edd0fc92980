import { describe, expect, it } from "vitest";
import { typographic, typographicAll } from "@/lib/core/tree/typographic";

describe("straight quotes in a tree", () => {
  it.each([
    ["Can't tell", "Can\u2019t tell"],
    ["the engines' oil, the skipper's", "the engines\u2019 oil, the skipper\u2019s"],
    ['Say "when", then stop', "Say \u201cwhen\u201d, then stop"],
    ["a hose of 5/8\" or 2' of pipe", "a hose of 5/8\" or 2' of pipe"],
  ])("%s is shown as print has it", (typed, shown) => {
    expect(typographic(typed)).toBe(shown);
  });

  it("are mended once: what is round already stays", () => {
    const once = typographicAll({ steps: [`Don't ask "why"`], cranks: 5, key: null });
    expect(once).toEqual({ steps: ["Don\u2019t ask \u201cwhy\u201d"], cranks: 5, key: null });
    expect(typographicAll(once)).toEqual(once);
  });
});
