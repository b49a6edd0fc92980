import "server-only";
import { sql } from "drizzle-orm";
import { appDatabase, type Transaction } from "@/db/client";

const waiting = new WeakMap<Transaction, (() => Promise<void>)[]>();

/**
 * Does something once the transaction stands, such as sending a mail: nobody then waits for a lock or a connection that
 * a slow mail server holds, and nothing is sent for what was rolled back. Where it fails, what was written stands.
 */
export function afterCommit(tx: Transaction, work: () => Promise<void>): void {
  const list = waiting.get(tx);
  if (!list) throw new Error("not a transaction of a fleet");
  list.push(work);
}

/**
 * One transaction behind the wall of one fleet. All settings are local to it: a pooled connection carries nothing into
 * the next request. Only lib/server/auth and lib/server/people open one; everybody else is handed a FleetScope.
 */
export async function inFleet<T>(fleetId: string, run: (tx: Transaction) => Promise<T>, statementTimeoutMs = 5_000): Promise<T> {
  const afterwards: (() => Promise<void>)[] = [];
  const result = await appDatabase().transaction(async (tx) => {
    waiting.set(tx, afterwards);
    await tx.execute(
      sql`select set_config('app.fleet_id', ${fleetId}, true), set_config('statement_timeout', ${String(statementTimeoutMs)}, true),
        set_config('lock_timeout', '3000', true), set_config('idle_in_transaction_session_timeout', '15000', true)`,
    );
    return run(tx);
  });
  for (const work of afterwards) await work();
  return result;
}
