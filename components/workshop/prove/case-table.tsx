import { Button } from "@/components/ui/button";
import { Chip, type ChipTone } from "@/components/ui/chip";
import { Table, type Column } from "@/components/ui/table";
import type { Verdict } from "@/lib/client/workshop/verdict";
import type { KnownCase } from "@/lib/core/tree/schema";
import type { Line } from "./prove-view";

type Props = {
  lines: readonly Line[];
  play: boolean;
  onOpen: ((key: string) => void) | null;
  onKeep: ((known: KnownCase) => void) | null;
  isKept: (key: string) => boolean;
};

const TONES: Readonly<Record<Verdict, ChipTone>> = { broke: "lead", worse: "buoy", same: "quiet", better: "sound" };
const ORDER: readonly Verdict[] = ["broke", "worse", "better", "same"];
const WORDS: Readonly<Record<Verdict, string>> = { broke: "Broke", worse: "Worse", same: "As before", better: "Better" };

/** Case by case, what the draft does to it: what broke first. */
export function CaseTable({ lines, play, onOpen, onKeep, isKept }: Props) {
  const sorted = [...lines].sort((a, b) => ORDER.indexOf(a.verdict) - ORDER.indexOf(b.verdict));
  const columns: Column<Line>[] = [
    {
      key: "case",
      title: "Case",
      cell: ({ known }) =>
        onOpen ? (
          <button type="button" className="link min-h-12 text-left" onClick={() => onOpen(known.key)}>
            {known.title}
          </button>
        ) : (
          known.title
        ),
    },
    { key: "verdict", title: "The draft", cell: ({ verdict }) => <Chip tone={TONES[verdict]}>{WORDS[verdict]}</Chip> },
    { key: "start", title: "At the start", figure: true, cell: ({ before, after }) => moved(before.start, after.start) },
    {
      key: "but",
      title: "Before the look that settled it",
      figure: true,
      cell: ({ before, after }) => moved(before.butConfirming, after.butConfirming),
    },
    { key: "all", title: "On all", figure: true, cell: ({ before, after }) => moved(before.all, after.all) },
    ...(play
      ? [{ key: "minutes", title: "Minutes", figure: true, cell: ({ before, after }: Line) => moved(before.minutes, after.minutes) }]
      : []),
    ...(onKeep
      ? [
          {
            key: "keep",
            title: "Keep",
            cell: ({ known }: Line) =>
              isKept(known.key) ? "Kept with the tree" : <Button onClick={() => onKeep(known)}>Keep as a known case</Button>,
          },
        ]
      : []),
  ];
  return (
    <Table
      caption="Place of the right cause, in the version in use and in the draft"
      columns={columns}
      rows={sorted}
      rowKey={({ known }) => known.key}
      empty={null}
    />
  );
}

/** "3 → 1"; one figure where nothing moved. */
function moved(before: number | null, after: number | null): string {
  const said = (at: number | null): string => (at === null ? "none" : String(Math.round(at)));
  return before === after ? said(after) : `${said(before)} → ${said(after)}`;
}
