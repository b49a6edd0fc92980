import { describe, expect, it } from "vitest";
import { keptWith, provedAs } from "@/lib/client/kept-with";

describe("what goes with an answer that takes the place of another", () => {
  it("is the note and the pictures that were there, and a new note over the old one", () => {
    const before = { note: "Old", photos: ["a"] };
    expect(keptWith(before, { note: "", photos: ["b"] })).toEqual({ note: "Old", photos: ["a", "b"] });
    expect(keptWith(before, { note: "New", photos: [] })).toEqual({ note: "New", photos: ["a"] });
    expect(keptWith(undefined, { note: "", photos: [] })).toEqual({ photos: [] });
  });
});

describe("how a cure was proved", () => {
  it("is what the tree asks for, and what was seen", () => {
    expect(provedAs("Ten minutes at full revs.", "")).toBe("Ten minutes at full revs.");
    expect(provedAs("Ten minutes at full revs.", "Held 2800.")).toBe("Ten minutes at full revs. Held 2800.");
  });

  it("loses none of what was typed where both are too long for one proof", () => {
    const typed = "w".repeat(490);
    expect(provedAs("Ten minutes at full revs.", typed)).toBe(typed);
  });
});
