import { describe, expect, it } from "vitest";
import { verdictOf } from "@/lib/client/workshop/verdict";

const at = (start: number | null, butConfirming: number | null, all: number | null, minutes: number | null = null) => ({
  start,
  butConfirming,
  all,
  minutes,
});

describe("what a change of the tree did to a known case", () => {
  it("broke it where its cause was among the first three on all that is told, and is no longer", () => {
    expect(verdictOf(at(9, 9, 3), at(1, 1, 4))).toBe("broke");
    expect(verdictOf(at(1, 1, 1), at(null, null, null))).toBe("broke");
  });
  it("is judged by the place before the look that settled it, then by all, the start and the minutes", () => {
    expect(verdictOf(at(1, 5, 1), at(3, 2, 2))).toBe("better");
    expect(verdictOf(at(1, 2, 1), at(1, 2, 2))).toBe("worse");
    expect(verdictOf(at(2, 2, 1), at(1, 2, 1))).toBe("better");
    expect(verdictOf(at(1, 1, 1, 60), at(1, 1, 1, 80))).toBe("worse");
    expect(verdictOf(at(1, 1, 1, 60), at(1, 1, 1, 60))).toBe("same");
  });
  it("counts a cause that the tree did not have before as worse than any place", () => {
    expect(verdictOf(at(null, null, null), at(200, 200, 200))).toBe("better");
  });
});
