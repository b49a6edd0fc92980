import { EmptyState } from "@/components/ui/empty-state";
import { Table, type Column } from "@/components/ui/table";
import type { PassageLine } from "@/lib/core/contract/passage";

const columns: readonly Column<PassageLine>[] = [
  {
    key: "part",
    title: "Part",
    cell: ({ title, fits }) => (
      <>
        {title}
        {fits && <span className="block text-ink-2">for {fits}</span>}
      </>
    ),
  },
  { key: "at90", title: "90 in 100", figure: true, cell: ({ carry }) => carry.at90 },
  { key: "at95", title: "95 in 100", figure: true, cell: ({ carry }) => carry.at95 },
  { key: "at99", title: "99 in 100", figure: true, cell: ({ carry }) => carry.at99 },
  { key: "mean", title: "Used on average", figure: true, cell: ({ mean }) => (mean < 0.1 ? "under 0.1" : mean.toFixed(1)) },
  {
    key: "driver",
    title: "What drives it",
    cell: ({ reasons }) => (
      <>
        {reasons[0]?.words}
        {reasons.length > 1 && <span className="block text-ink-2">and {reasons.length - 1} more</span>}
      </>
    ),
  },
];

/** How many of each part are enough so many times in 100, the most used first. */
export function CarryTable({ lines }: { lines: readonly PassageLine[] }) {
  return (
    <Table
      caption="How many to have aboard so that they are enough"
      columns={columns}
      rows={lines}
      rowKey={({ part, fits }) => `${part} ${fits ?? ""}`}
      empty={<EmptyState title="Nothing to carry">No part would be wanted more than 1 time in 100 on so short a passage.</EmptyState>}
    />
  );
}
