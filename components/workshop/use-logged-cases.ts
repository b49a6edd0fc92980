"use client";

import { useEffect, useState } from "react";
import * as z from "zod";
import { NoAnswer, request } from "@/lib/client/exchange/request";
import { LoggedCase } from "@/lib/core/contract/logged-case";

const Answer = z.object({ items: z.array(LoggedCase) });

export type LoggedCases = { cases: readonly LoggedCase[] } | { failed: string } | null;

/** The fleet's diagnoses that ended in a proved cure; null while they are fetched. */
export function useLoggedCases(fleetId: string): LoggedCases {
  const [logged, setLogged] = useState<LoggedCases>(null);
  useEffect(() => {
    let current = true;
    request(`/api/v1/fleets/${fleetId}/trees/logged-cases`)
      .then((answer) => current && setLogged({ cases: Answer.parse(answer).items }))
      .catch(
        (failure: unknown) =>
          current &&
          setLogged({
            failed:
              failure instanceof NoAnswer && failure.isNoSignal
                ? "There is no signal: the log is on the server."
                : "The log could not be read.",
          }),
      );
    return () => {
      current = false;
    };
  }, [fleetId]);
  return logged;
}
