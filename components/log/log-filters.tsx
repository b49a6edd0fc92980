import { Button } from "@/components/ui/button";
import { LinkButton } from "@/components/ui/link-button";
import { Select } from "@/components/ui/select";
import type { Boat, Engine } from "@/lib/core/contract/engine";
import { FILTERS, OUTCOME_TITLES, type Filters } from "./filters";

type Props = {
  path: string;
  filters: Filters;
  boats: readonly Boat[];
  engines: readonly Engine[];
  systems: readonly { key: string; title: string }[];
};

/** Narrows the log. A plain form that puts its choices into the address: it can be linked to, goes back, and needs no script. */
export function LogFilters({ path, filters, boats, engines, systems }: Props) {
  const any = (title: string) => ({ value: "", title });
  return (
    <form action={path} method="get" className="no-print grid grid-cols-2 items-end gap-3 xl:grid-cols-[repeat(4,1fr)_auto]">
      <Select
        id="boat"
        name="boat"
        label="Boat"
        defaultValue={filters.boat ?? ""}
        options={[any("All boats"), ...boats.map(({ id, name }) => ({ value: id, title: name }))]}
      />
      <Select
        id="engine"
        name="engine"
        label="Engine"
        defaultValue={filters.engine ?? ""}
        options={[any("All engines"), ...engines.map(({ id, name, boatName }) => ({ value: id, title: `${boatName}, ${name}` }))]}
      />
      <Select
        id="system"
        name="system"
        label="System"
        defaultValue={filters.system ?? ""}
        options={[any("All systems"), ...systems.map(({ key, title }) => ({ value: key, title }))]}
      />
      <Select
        id="outcome"
        name="outcome"
        label="Outcome"
        defaultValue={filters.outcome ?? ""}
        options={[any("Any"), ...Object.entries(OUTCOME_TITLES).map(([value, title]) => ({ value, title }))]}
      />
      <div className="flex flex-wrap gap-2">
        <Button type="submit">Show</Button>
        {FILTERS.some((name) => filters[name]) && (
          <LinkButton tone="quiet" href={path} prefetch={false}>
            Show all
          </LinkButton>
        )}
      </div>
    </form>
  );
}
