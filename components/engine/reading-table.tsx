import Link from "next/link";
import { Day } from "@/components/log/day";
import { EmptyState } from "@/components/ui/empty-state";
import { Table, type Column } from "@/components/ui/table";
import type { ListedReading } from "@/lib/core/contract/engine";

const WITH = { repair: "with a repair", diagnosis: "with a diagnosis" } as const;

/** The readings of an engine's hour meter; each leads to where it can be corrected. */
export function ReadingTable({ home, readings }: { home: string; readings: readonly ListedReading[] }) {
  const columns: Column<ListedReading>[] = [
    { key: "day", title: "Read on", cell: (one) => <Day at={one.readAt} /> },
    { key: "reading", title: "The meter showed", figure: true, cell: (one) => `${one.reading} h` },
    { key: "hours", title: "Hours since new", figure: true, cell: (one) => (one.hours === null ? "–" : Math.round(one.hours)) },
    {
      key: "remarks",
      title: "Remarks",
      cell: (one) =>
        [
          one.reset && "meter replaced or set back",
          one.doubtful && "does not fit the others, not counted",
          one.version > 1 && "corrected",
          one.partOf && `written down ${WITH[one.partOf]}`,
        ]
          .filter(Boolean)
          .join(", "),
    },
    { key: "correct", title: "Correct", cell: (one) => <CorrectLink home={home} reading={one} /> },
  ];
  return (
    <Table
      caption="Readings of the hour meter"
      hideCaption
      columns={columns}
      rows={readings}
      rowKey={({ id }) => id}
      empty={<EmptyState title="No reading yet">What the meter shows is written down on the engine&rsquo;s page.</EmptyState>}
    />
  );
}

/** One that came with a repair is corrected there; one that came with a diagnosis goes with its outcome. */
function CorrectLink({ home, reading: { id, partOf } }: { home: string; reading: ListedReading }) {
  if (partOf === "diagnosis") return "–";
  return (
    <Link
      className="link inline-flex min-h-12 items-center"
      prefetch={false}
      href={`${home}/${partOf === "repair" ? "repairs" : "hours"}/${id}`}
    >
      {partOf === "repair" ? "The repair" : "This reading"}
    </Link>
  );
}
