"use client";

import { useState } from "react";
import { FIGURE_LIMITS } from "@/lib/core/contract/figure-limits";
import type { EngineFigure } from "@/lib/core/tree/schema";
import { readNumber } from "@/lib/core/units/read-number";
import { missingFigures } from "@/lib/client/missing-figures";
import { Button } from "@/components/ui/button";
import { Form } from "@/components/ui/form";
import { TextField } from "@/components/ui/text-field";
import { useHere } from "./here";

const ASKS: Record<EngineFigure, { ask: string; hint: string }> = {
  ratedRpm: {
    ask: "What is this engine's rated speed, in rpm?",
    hint: "On its plate or in the manual; often 2400 to 3600.",
  },
  noLoadRpm: {
    ask: "What is its highest speed without load, in rpm?",
    hint: "In the manual; a little over the rated speed.",
  },
  idleRpm: { ask: "What is its idle speed, in rpm?", hint: "In the manual; often 700 to 950." },
  openingTemperatureC: {
    ask: "At what temperature does its thermostat open, in \u00b0C?",
    hint: "Stamped on the thermostat; often 60 to 85.",
  },
};

/** A reading can only be judged against a figure of this engine: asked for once, here, and only if it is known. */
export function MissingFigure({ checkKey }: { checkKey: string }) {
  const { tree, view, record } = useHere();
  const [typed, setTyped] = useState("");
  const [wrong, setWrong] = useState<string>();
  const check = tree.checks.find(({ key }) => key === checkKey);
  const [figure] = check ? missingFigures(check, view.profile) : [];
  if (!figure) return null;
  const { ask, hint } = ASKS[figure];
  const { from, to } = FIGURE_LIMITS[figure];
  return (
    <Form
      className="mt-4 grid gap-2 rounded-xl border-[1.5px] border-edge bg-sheet p-3.5"
      onSubmit={(event) => {
        event.preventDefault();
        const value = readNumber(typed);
        if (value === null || value < from || value > to)
          return setWrong(`A figure between ${from} and ${to}. Leave it if you do not know; the answers in words will do.`);
        setWrong(undefined);
        void record("figure-told", { figure, value });
      }}
    >
      <TextField
        id={`figure-${figure}`}
        label={ask}
        hint={hint}
        optional
        inputMode="decimal"
        className="dial"
        value={typed}
        error={wrong}
        onChange={(event) => setTyped(event.target.value)}
      />
      <Button type="submit">Use this figure</Button>
    </Form>
  );
}
