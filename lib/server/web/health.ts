import "server-only";
import { sql } from "drizzle-orm";
import { appDatabase, identityDatabase } from "@/db/client";

/** Can both roles reach the database? */
export async function isHealthy(): Promise<boolean> {
  try {
    await Promise.all([appDatabase().execute(sql`select 1`), identityDatabase().execute(sql`select 1`)]);
    return true;
  } catch (error) {
    console.error("health:", error);
    return false;
  }
}
