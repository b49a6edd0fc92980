"use client";

import { useEffect, useState } from "react";
import { Notice } from "@/components/ui/notice";
import { forgetPerson } from "@/lib/client/person";
import { countUnsent } from "@/lib/client/unsent";
import { ActionForm } from "./action-form";
import type { FormAction } from "./form-action";

type Props = { userId: string; fleetIds: readonly string[]; signOut: FormAction; signOutEverywhere: FormAction };

/** The way out. What has not been sent stays on the device until this person signs in here again, and that is said first. */
export function SignOut({ userId, fleetIds, signOut, signOutEverywhere }: Props) {
  const [unsent, setUnsent] = useState(0);
  const fleets = fleetIds.join(" ");
  useEffect(() => {
    let wanted = true;
    countUnsent(userId, fleets.split(" ").filter(Boolean)).then(
      (count) => wanted && setUnsent(count),
      // A browser that keeps nothing has nothing waiting.
      () => undefined,
    );
    return () => {
      wanted = false;
    };
  }, [userId, fleets]);
  const forgetting = (action: FormAction): FormAction => {
    return (before, form) => {
      forgetPerson();
      return action(before, form);
    };
  };
  return (
    <div className="grid gap-4">
      {unsent > 0 && (
        <Notice tone="look" title={unsent === 1 ? "1 entry has not been sent yet" : `${unsent} entries have not been sent yet`} live>
          Open “Diagnose” with a signal before you sign out. If you sign out now they stay on this device, unseen by others, until you sign
          in on it again.
        </Notice>
      )}
      <div className="flex flex-wrap gap-3">
        <ActionForm action={forgetting(signOut)} submit="Sign out" />
        <ActionForm action={forgetting(signOutEverywhere)} submit="Sign out on all devices" tone="plain" />
      </div>
    </div>
  );
}
