import type { Metadata } from "next";
import { CarryTable } from "@/components/passage/carry-table";
import { PASSAGE_FIELDS, PassageForm, type PassageFields } from "@/components/passage/passage-form";
import { PrintButton } from "@/components/log/print-button";
import { BackTo } from "@/components/shell/back-to";
import { Card } from "@/components/ui/card";
import { PageHead } from "@/components/ui/page-head";
import { PassageQuery } from "@/lib/core/contract/passage";
import { planForBoat } from "@/lib/server/boats/passage";
import { getBoat } from "@/lib/server/boats/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../../known-id";

export const metadata: Metadata = { title: "Spares for a passage" };

export default async function PassagePage({ params, searchParams }: PageProps<"/f/[fleetId]/boats/[boatId]/passage">) {
  const { fleetId, boatId } = await params;
  const search = await searchParams;
  const fields: PassageFields = Object.fromEntries(
    PASSAGE_FIELDS.flatMap((name) => {
      const value = search[name];
      return typeof value === "string" && value.trim() !== "" ? [[name, value.trim()]] : [];
    }),
  );
  const asked = Object.keys(fields).length > 0 ? PassageQuery.safeParse(fields) : null;
  const { boat, lines } = await pageScope("log:read", fleetId, async (scope) => ({
    boat: await getBoat(scope, knownId(boatId)),
    lines: asked?.success ? await planForBoat(scope, boatId, asked.data) : null,
  }));
  const errors = Object.fromEntries((asked?.error?.issues ?? []).map((issue) => [String(issue.path[0]), issue.message]));
  return (
    <>
      <PageHead
        title="Spares for a passage"
        under={boat.name}
        back={<BackTo href={`/f/${fleetId}/boats/${boatId}`} title={boat.name} />}
        action={lines && <PrintButton />}
      />
      <div className="grid gap-5">
        <Card aria-label="The passage">
          <PassageForm path={`/f/${fleetId}/boats/${boatId}/passage`} fields={fields} errors={errors} />
        </Card>
        {lines && (
          <Card aria-labelledby="carry">
            <h2 id="carry" className="mb-2">
              What to carry
            </h2>
            <CarryTable lines={lines} />
            <p className="mt-3 text-sm text-ink-2">
              From the usual upkeep of an engine like this, what its log and the fleet&apos;s say of its faults, and guesses where they say
              nothing. Upkeep that falls due before long is better done before leaving. The maker&apos;s own list comes first.
            </p>
          </Card>
        )}
      </div>
    </>
  );
}
