"use client";

import { useMemo, useState } from "react";
import { Button } from "@/components/ui/button";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Place } from "../place";
import { checksFor, columnsOf, rowsOf } from "./columns";
import { StrengthGrid } from "./strength-grid";

/** Checks on one sheet of the table; more are too wide to work in. */
const CHECKS_A_SHEET = 10;

type Props = { bench: Workbench; tree: FaultTree; symptom: string; onOpen: (node: Place["node"]) => void };

/** Causes against findings for one symptom: for dense work, cell by cell. */
export function TableView({ bench, tree, symptom, onOpen }: Props) {
  const [sheet, setSheet] = useState(0);
  const causes = useMemo(() => rowsOf(tree, symptom), [tree, symptom]);
  const checks = useMemo(() => checksFor(tree, causes), [tree, causes]);
  const sheets = Math.max(1, Math.ceil(checks.length / CHECKS_A_SHEET));
  const here = Math.min(sheet, sheets - 1);
  const columns = useMemo(
    () => checks.slice(here * CHECKS_A_SHEET, (here + 1) * CHECKS_A_SHEET).flatMap((check) => columnsOf(check, causes)),
    [checks, causes, here],
  );
  const title = tree.symptoms.find(({ key }) => key === symptom)?.title ?? symptom;
  return (
    <div className="flex min-h-0 flex-1 flex-col gap-3">
      <div className="flex flex-wrap items-center gap-3">
        <h2 className="mr-auto">{title}: causes against findings</h2>
        <p className="text-sm text-ink-2">
          Checks {here * CHECKS_A_SHEET + 1} to {Math.min(checks.length, (here + 1) * CHECKS_A_SHEET)} of {checks.length}
        </p>
        <Button disabled={here === 0} onClick={() => setSheet(here - 1)}>
          Earlier checks
        </Button>
        <Button disabled={here === sheets - 1} onClick={() => setSheet(here + 1)}>
          Further checks
        </Button>
      </div>
      <p className="text-sm text-ink-2">
        Arrows move, typing or Enter changes a cell (a word, a share such as 0.4, or times as often as sound such as x20), Delete empties
        it. A column or row marked = tells nothing apart.
      </p>
      <StrengthGrid bench={bench} causes={causes} columns={columns} onOpen={onOpen} />
    </div>
  );
}
