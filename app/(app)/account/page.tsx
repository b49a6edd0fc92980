import type { Metadata } from "next";
import Link from "next/link";
import { ChangeAddressForm, ChangeNameForm, ChangePasswordForm, StartFleetForm } from "@/components/people/account-forms";
import { DeviceList } from "@/components/people/device-list";
import { SignOut } from "@/components/people/sign-out";
import { FleetShell } from "@/components/shell/fleet-shell";
import { Card } from "@/components/ui/card";
import { EmptyState } from "@/components/ui/empty-state";
import { PageHead } from "@/components/ui/page-head";
import { listSessions } from "@/lib/server/auth/sessions";
import { fleetsOf } from "@/lib/server/people/queries";
import { signedInPerson } from "@/lib/server/web/page-scope";
import { changeAddress, changeName, changePassword, endOtherSessions, endSession, signOut, signOutEverywhere, startFleet } from "./actions";

export const metadata: Metadata = { title: "Your account" };

export default async function AccountPage() {
  const person = await signedInPerson("/account");
  const [fleets, devices] = await Promise.all([fleetsOf(person), listSessions(person)]);
  const only = fleets.length === 1 ? fleets[0] : undefined;
  return (
    <FleetShell fleet={only ?? null} fleets={fleets} personName={person.name}>
      <PageHead title="Your account" under={`${person.name}, ${person.email}`} />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <div className="grid gap-5">
          <Card aria-labelledby="fleets">
            <h2 id="fleets">Your fleets</h2>
            {fleets.length === 0 ? (
              <div className="mt-2">
                <EmptyState title="You are in no fleet">Somebody who owns one can invite you by mail. Or start one of your own.</EmptyState>
                <div className="mt-4">
                  <StartFleetForm action={startFleet} />
                </div>
              </div>
            ) : (
              <ul className="divide-y divide-rule">
                {fleets.map((fleet) => (
                  <li key={fleet.id} className="flex flex-wrap items-center gap-x-3">
                    <Link className="link inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleet.id}`}>
                      {fleet.name}
                    </Link>
                    <span className="text-sm text-ink-2">{fleet.roles.join(", ")}</span>
                  </li>
                ))}
              </ul>
            )}
          </Card>
          <Card aria-labelledby="devices">
            <h2 id="devices">Where you are signed in</h2>
            <DeviceList devices={devices} end={endSession} endOthers={endOtherSessions} />
          </Card>
          <Card aria-labelledby="sign-out">
            <h2 id="sign-out" className="mb-3">
              Sign out
            </h2>
            <SignOut userId={person.userId} fleetIds={fleets.map(({ id }) => id)} signOut={signOut} signOutEverywhere={signOutEverywhere} />
          </Card>
        </div>
        <div className="grid gap-5">
          <Card aria-labelledby="your-name">
            <h2 id="your-name" className="mb-3">
              Your name
            </h2>
            <ChangeNameForm action={changeName} name={person.name} />
          </Card>
          <Card aria-labelledby="address">
            <h2 id="address" className="mb-3">
              Your e-mail address
            </h2>
            <ChangeAddressForm action={changeAddress} />
          </Card>
          <Card aria-labelledby="new-password">
            <h2 id="new-password" className="mb-3">
              Your password
            </h2>
            <ChangePasswordForm action={changePassword} />
          </Card>
        </div>
      </div>
    </FleetShell>
  );
}
