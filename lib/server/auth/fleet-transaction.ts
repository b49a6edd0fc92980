import "server-only";
import { sql } from "drizzle-orm";
import { appDatabase, type Transaction } from "@/db/client";

/**
 * One transaction behind the wall of one fleet. All settings are local to it: a pooled connection carries nothing into
 * the next request. Only lib/server/auth and lib/server/people open one; everybody else is handed a FleetScope.
 */
export async function inFleet<T>(fleetId: string, run: (tx: Transaction) => Promise<T>, statementTimeoutMs = 5_000): Promise<T> {
  return appDatabase().transaction(async (tx) => {
    await tx.execute(
      sql`select set_config('app.fleet_id', ${fleetId}, true), set_config('statement_timeout', ${String(statementTimeoutMs)}, true),
        set_config('lock_timeout', '3000', true), set_config('idle_in_transaction_session_timeout', '15000', true)`,
    );
    return run(tx);
  });
}
