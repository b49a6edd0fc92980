import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { engineClock, type MeterReading } from "../../../lib/core/recurrence/engine-clock";

const day = (n: number) => new Date(Date.UTC(2026, 0, n)).toISOString();
const read = (n: number, reading: number, reset = false): MeterReading => ({ id: `r${n}-${reading}`, readAt: day(n), reading, reset });
const metered = (readings: MeterReading[], estimatedHoursPerYear?: number) =>
  engineClock({ hasHourMeter: true, readings, estimatedHoursPerYear });

describe("engineClock", () => {
  it("[H1][H2] reads hours off the meter, in whatever order they were typed", () => {
    const clock = metered([read(20, 130), read(1, 100)]);
    expect(clock.at(day(20))).toEqual({ hours: 130, estimated: false });
    expect(clock.latest).toMatchObject({ reading: 130, hours: 130, readAt: day(20) });
  });

  it("[H3] goes on from the sum when the meter is replaced", () => {
    const clock = metered([read(1, 1800), read(10, 1850), read(11, 0, true), read(30, 40), read(40, 3, true), read(50, 10)]);
    expect(clock.at(day(11)).hours).toBe(1850);
    expect(clock.at(day(30)).hours).toBe(1890);
    expect(clock.latest).toMatchObject({ reading: 10, hours: 1897 });
  });

  it("[H4] sets one mistyped reading aside, high or low", () => {
    expect(metered([read(1, 100), read(2, 1040), read(3, 110), read(4, 115)])).toMatchObject({
      doubtful: ["r2-1040"],
      latest: { hours: 115 },
    });
    expect(metered([read(1, 100), read(2, 104), read(3, 11), read(4, 115)])).toMatchObject({ doubtful: ["r3-11"], latest: { hours: 115 } });
  });

  it("[H4] believes the later of two that disagree", () => {
    expect(metered([read(1, 1000), read(2, 101)])).toMatchObject({ doubtful: ["r1-1000"], latest: { hours: 101 } });
  });

  it("[H5] draws a straight line between two readings, and says so", () => {
    expect(metered([read(1, 100), read(11, 120)]).at(day(6))).toEqual({ hours: 110, estimated: true });
  });

  it("[H6] does not guess outside the readings without a yearly figure", () => {
    const clock = metered([read(10, 100)]);
    expect(clock.at(day(1)).hours).toBeNull();
    expect(clock.at(day(20)).hours).toBeNull();
    expect(metered([]).at(day(1))).toEqual({ hours: null, estimated: false });
  });

  it("[H6] goes on at the yearly figure outside the readings, never below nothing", () => {
    const clock = metered([read(1, 5)], 365.25);
    expect(clock.at(day(11))).toEqual({ hours: 15, estimated: true });
    expect(clock.at("2025-06-01T00:00:00Z")).toEqual({ hours: 0, estimated: true });
  });

  it("[H7] counts an engine without a meter from the first moment of its log", () => {
    const clock = engineClock({ hasHourMeter: false, estimatedHoursPerYear: 365.25, readings: [], since: day(1) });
    expect(clock.at(day(101))).toEqual({ hours: 100, estimated: true });
    expect(engineClock({ hasHourMeter: false, readings: [], since: day(1) }).at(day(101))).toEqual({ hours: null, estimated: true });
  });

  it("[H7] never calls the hours of an engine without a meter anything but estimated", () => {
    const clock = engineClock({ hasHourMeter: false, estimatedHoursPerYear: 100, readings: [read(1, 900)] });
    expect(clock.at(day(1))).toEqual({ hours: 900, estimated: true });
  });

  it("[H2] never runs back, whatever is typed", () => {
    const readings = fc.array(
      fc.record({ n: fc.integer({ min: 1, max: 60 }), value: fc.integer({ min: 0, max: 3000 }), reset: fc.boolean() }),
      { maxLength: 14 },
    );
    fc.assert(
      fc.property(readings, (typed) => {
        const clock = metered(
          typed.map((t, i) => ({ ...read(t.n, t.value, t.reset), id: String(i) })),
          200,
        );
        const hours = Array.from({ length: 70 }, (_, i) => clock.at(day(i + 1)).hours ?? 0);
        for (const [i, h] of hours.entries()) expect(h + 1e-9).toBeGreaterThanOrEqual(hours[i - 1] ?? 0);
      }),
      { seed: 11 },
    );
  });
});
