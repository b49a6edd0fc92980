import type { ReactNode } from "react";
import { Mark } from "@/components/ui/mark";
import { LightSwitch } from "@/components/ui/light-switch";
import { FleetNav } from "./fleet-nav";
import { FoldedNav } from "./folded-nav";

type Props = {
  /** null: a page that belongs to the person and to no fleet. */
  fleet: { id: string; name: string } | null;
  /** Other fleets this person is in; with one fleet there is nothing to choose. */
  fleets: readonly { id: string; name: string }[];
  personName: string;
  children: ReactNode;
};

/** The frame round everything that needs the server: the way about at the left, on a phone folded into the top. */
export function FleetShell({ fleet, fleets, personName, children }: Props) {
  return (
    <div className="min-h-dvh lg:grid lg:grid-cols-[13rem_minmax(0,1fr)] print:block">
      <header className="no-print bg-deep text-on-deep lg:min-h-dvh lg:px-3.5 lg:py-5">
        <div className="flex items-center gap-2.5 px-4 py-2 lg:mb-6 lg:px-1 lg:py-0">
          <Mark />
          <span className="text-xl font-bold">Gudgeon</span>
          <span className="ml-auto lg:hidden">
            <LightSwitch />
          </span>
        </div>
        <FoldedNav title={fleet?.name ?? personName}>
          <FleetNav fleet={fleet} fleets={fleets} personName={personName} />
        </FoldedNav>
        <div className="hidden lg:block">
          {fleet && <p className="mb-2 border-b border-on-deep/25 px-3 pb-3 font-semibold">{fleet.name}</p>}
          <FleetNav fleet={fleet} fleets={fleets} personName={personName} />
          <div className="pt-6">
            <LightSwitch />
          </div>
        </div>
      </header>
      <main id="main" className="mx-auto w-full min-w-0 max-w-6xl has-data-wide:max-w-none px-4 pt-5 pb-16 lg:px-9 lg:pt-7">
        {children}
      </main>
    </div>
  );
}
