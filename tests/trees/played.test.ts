import path from "node:path";
import { beforeAll, describe, expect, it, vi } from "vitest";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree, Situation, Who } from "@/lib/core/tree/schema";
import { readTreeFolder } from "@/lib/server/trees/read-tree-folder";
import { causesToPlay, playCause, type PlayedCause } from "./play-causes";

const folder = path.resolve(import.meta.dirname, "../../trees/small-marine-diesel");
// Thousands of next steps: half a minute on a quiet machine.
vi.setConfig({ testTimeout: 300_000, hookTimeout: 300_000 });

const SHARE_ENDED_WELL = { mechanic: 0.85, skipper: 0.95 };

describe.each([
  { who: "mechanic", person: "mechanic", situation: "alongside", endedWell: SHARE_ENDED_WELL.mechanic },
  { who: "skipper", person: "skipper-at-sea", situation: "at-anchor", endedWell: SHARE_ENDED_WELL.skipper },
] satisfies { who: string; person: Who; situation: Situation; endedWell: number }[])(
  "every cause of the shipped tree, played by a $who $situation",
  ({ who, person, situation, endedWell }) => {
    let played: readonly PlayedCause[] = [];
    const mean = (of: (one: PlayedCause) => number): number => played.reduce((sum, one) => sum + of(one), 0) / played.length;

    beforeAll(async () => {
      const read = await readTreeFolder(folder);
      const parsed = "faults" in read ? null : parseTree(read.document);
      if (!parsed || !("tree" in parsed)) throw new Error("the shipped tree cannot be read");
      const tree: FaultTree = parsed.tree;
      played = causesToPlay(tree, situation).map(({ cause, symptom }) => playCause(tree, cause, symptom, person, situation));
      const count = (of: (one: PlayedCause) => boolean): number => played.filter(of).length;
      console.info(
        `${who}, ${situation}: ${played.length} causes; cured ${count(({ end }) => end === "cured")}, held ${count(({ end }) => end === "held")}, ` +
          `rightly handed over ${count((one) => one.rightlyHandedOver)}, called too soon ${count((one) => one.end === "called" && !one.rightlyHandedOver)}; ` +
          `${mean(({ steps }) => steps.length).toFixed(1)} steps, ${mean(({ minutes }) => minutes).toFixed(0)} min ` +
          `(base-rate order ${mean((one) => one.baseRateMinutes).toFixed(0)})`,
      );
    });

    it(`ends cured, held, or rightly handed over in at least ${endedWell * 100} of 100`, () => {
      const ill = played
        .filter((one) => one.end === "called" && !one.rightlyHandedOver)
        .map(({ cause, symptom }) => `${cause} / ${symptom}`);
      expect(1 - ill.length / played.length, ill.join("\n")).toBeGreaterThanOrEqual(endedWell);
    });

    it("takes at most half of what the base-rate order takes, calls priced for both", () => {
      expect(mean(({ minutes }) => minutes)).toBeLessThan(0.5 * mean((one) => one.baseRateMinutes));
    });

    it("never calls while a look under ten minutes tells more for its minutes than whoever is called would find", () => {
      expect(played.filter(({ cheapLeft }) => cheapLeft.length > 0).map(({ cause, cheapLeft }) => `${cause}: ${cheapLeft.join()}`)).toEqual(
        [],
      );
    });

    // 32 while the tree had 88 causes, 34 on the whole one of 217.
    it("asks and tries at most 34 things", () => {
      expect(Math.max(...played.map(({ steps }) => steps.length))).toBeLessThanOrEqual(34);
    });
  },
);
