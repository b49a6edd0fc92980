"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import { clsx } from "clsx";

type Props = { fleet: { id: string; name: string } | null; fleets: readonly { id: string; name: string }[]; personName: string };

/** The rooms of a fleet, one word a noun. Outside a fleet: the fleets to choose from. */
export function FleetNav({ fleet, fleets, personName }: Props) {
  const here = usePathname();
  const account = { href: "/account", title: personName, isHere: here.startsWith("/account") };
  const places = fleet ? [...roomsOf(fleet.id, here), account] : [account];
  const others = fleets.filter((f) => f.id !== fleet?.id);
  return (
    <nav aria-label="Fleet">
      <ul className="grid gap-0.5">
        {places.map((place) => (
          <li key={place.href}>
            <Link
              href={place.href}
              prefetch={false}
              aria-current={place.isHere ? "page" : undefined}
              className={clsx("flex min-h-12 items-center rounded-lg px-3 text-sm", place.isHere && "bg-on-deep/16 font-semibold")}
            >
              {place.title}
            </Link>
          </li>
        ))}
      </ul>
      {others.length > 0 && (
        <div className="pt-4">
          <p className="px-3 text-sm">{fleet ? "Your other fleets" : "Your fleets"}</p>
          <ul>
            {others.map((f) => (
              <li key={f.id}>
                <Link href={`/f/${f.id}`} prefetch={false} className="flex min-h-12 items-center rounded-lg px-3 text-sm">
                  {f.name}
                </Link>
              </li>
            ))}
          </ul>
        </div>
      )}
    </nav>
  );
}

function roomsOf(fleetId: string, here: string) {
  const home = `/f/${fleetId}`;
  return [
    { href: `/diagnose?fleet=${fleetId}`, title: "Diagnose", isHere: false },
    { href: home, title: "Boats", isHere: here === home || here.startsWith(`${home}/boats`) || here.startsWith(`${home}/engines`) },
    { href: `${home}/log`, title: "Logged diagnoses", isHere: here.startsWith(`${home}/log`) },
    { href: `${home}/trees`, title: "Fault trees", isHere: here.startsWith(`${home}/trees`) },
    { href: `${home}/people`, title: "People", isHere: here.startsWith(`${home}/people`) },
  ];
}
