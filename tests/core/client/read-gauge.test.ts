import { describe, expect, it } from "vitest";
import { readGauge } from "@/lib/client/read-gauge";

const SCALE = {
  quantity: "pressure" as const,
  unit: "kPa",
  from: 0,
  to: 100,
  bands: [
    { finding: "low", title: "Low", from: 0, to: 13 },
    { finding: "raised", title: "Raised", from: 13, to: 25 },
    { finding: "high", title: "High", from: 25, to: 100 },
  ],
};

describe("a reading as it is typed", () => {
  it("says which band it falls in, the edge belonging to the upper one", () => {
    expect(readGauge("24.9", "kPa", SCALE)).toMatchObject({ value: 24.9, band: { finding: "raised" } });
    expect(readGauge("25", "kPa", SCALE)).toMatchObject({ band: { finding: "high" } });
    expect(readGauge("100", "kPa", SCALE)).toMatchObject({ band: { finding: "high" } });
  });

  it("takes any unit of the quantity and a comma, and keeps the figure as typed", () => {
    const read = readGauge("9,5", "inHg", SCALE);
    expect(read).toMatchObject({ value: 9.5, band: { finding: "high" } });
    // 1 inHg is 3.38639 kPa (NIST SP 811, appendix B).
    expect(read && "inUnit" in read ? read.inUnit : 0).toBeCloseTo(32.1707, 3);
  });

  it("refuses what is outside the scale, and says what it came to", () => {
    const read = readGauge("31", "psi", SCALE);
    expect(read).toEqual({ wrong: "This is outside the scale of 0 to 100 kPa. That is 214 kPa. Read it again, or pick another unit." });
    expect(readGauge("-1", "kPa", SCALE)).toHaveProperty("wrong");
  });

  it("refuses what is no figure, and says nothing of an empty field", () => {
    expect(readGauge("about 12", "kPa", SCALE)).toHaveProperty("wrong");
    expect(readGauge("  ", "kPa", SCALE)).toBeNull();
  });
});
