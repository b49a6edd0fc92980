import Link from "next/link";
import type { ReactNode } from "react";
import { Table, type Column } from "@/components/ui/table";
import { EmptyState } from "@/components/ui/empty-state";
import type { LogEntry } from "@/lib/core/contract/log";
import { Day } from "./day";
import { EntryMore } from "./entry-more";
import { hoursInWords } from "./hours-in-words";
import { LogCards } from "./log-cards";
import { Standing } from "./standing";

type Props = {
  fleetId: string;
  entries: readonly LogEntry[];
  caption: string;
  /** Over several engines: say which. */ namesEngine?: boolean;
  empty?: ReactNode;
};

/** The log as a table: what was reported, found and done, and how it stands. */
export function LogTable({ fleetId, entries, caption, namesEngine = false, empty }: Props) {
  const columns: Column<LogEntry>[] = [
    { key: "when", title: "When", cell: (e) => <LogLink fleetId={fleetId} entry={e} /> },
    ...(namesEngine ? [{ key: "engine", title: "Engine", cell: (e: LogEntry) => `${e.boatName}, ${e.engineName}` }] : []),
    {
      key: "hours",
      title: "Engine hours",
      figure: true,
      cell: hoursInWords,
    },
    { key: "reported", title: "Reported", cell: (e) => e.symptoms.map((s) => s.title).join(", ") || "–" },
    { key: "found", title: "Found", cell: (e) => e.cause?.title ?? "–" },
    {
      key: "cured",
      title: "Cured by",
      cell: (e) => (
        <>
          {e.remedy?.title ?? "–"}
          {e.outcome !== null && <EntryMore entry={e} />}
        </>
      ),
    },
    { key: "minutes", title: "Minutes", figure: true, cell: (e) => (e.minutes === null ? "–" : Math.round(e.minutes)) },
    { key: "standing", title: "Standing", cell: (e) => <Standing entry={e} /> },
  ];
  if (entries.length === 0) {
    return (
      <>
        {empty ?? (
          <EmptyState title="Nothing logged yet">A diagnosis that is ended, or a repair that is written in, stands here.</EmptyState>
        )}
      </>
    );
  }
  return (
    <>
      <div className="md:hidden print:hidden">
        <LogCards
          entries={entries}
          caption={caption}
          namesEngine={namesEngine}
          dayOf={(entry) => <LogLink fleetId={fleetId} entry={entry} />}
        />
      </div>
      <div className="hidden md:block print:block">
        <Table caption={caption} hideCaption columns={columns} rows={entries} rowKey={(e) => e.id} empty={null} />
      </div>
    </>
  );
}

function LogLink({ fleetId, entry }: { fleetId: string; entry: LogEntry }) {
  const day = <Day at={entry.at} />;
  const home = `/f/${fleetId}`;
  const href = entry.diagnosisId === null ? `${home}/engines/${entry.engineId}/repairs/${entry.id}` : `${home}/log/${entry.diagnosisId}`;
  return (
    <>
      <Link className="link inline-flex min-h-12 items-center md:min-h-0" prefetch={false} href={href}>
        {day}
      </Link>
      {(entry.version ?? 1) > 1 && <span className="block text-sm text-ink-2">corrected</span>}
    </>
  );
}
