import { FleetShell } from "@/components/shell/fleet-shell";
import { fleetsOf, getFleet } from "@/lib/server/people/queries";
import { pageScope, signedInPerson } from "@/lib/server/web/page-scope";

export default async function FleetLayout({ params, children }: LayoutProps<"/f/[fleetId]">) {
  const { fleetId } = await params;
  const fleet = await pageScope("fleet:read", fleetId, (scope) => getFleet(scope));
  const person = await signedInPerson(`/f/${fleetId}`);
  return (
    <FleetShell fleet={fleet} fleets={await fleetsOf(person)} personName={person.name}>
      {children}
    </FleetShell>
  );
}
