import "server-only";
import { uuidv7 } from "uuidv7";
import type { Database, Transaction } from "@/db/client";
import { credentials, users } from "@/db/schema/users";

/** A person whose address is proved, with a password already hashed; null when the address belongs to somebody. */
export async function makeUser(
  on: Database | Transaction,
  { userId = uuidv7(), name, email, passwordHash }: { userId?: string; name: string; email: string; passwordHash: string },
): Promise<string | null> {
  const [row] = await on
    .insert(users)
    .values({ id: userId, name, email })
    .onConflictDoNothing({ target: users.email })
    .returning({ id: users.id });
  if (!row) return null;
  await on.insert(credentials).values({ userId, passwordHash });
  return userId;
}
