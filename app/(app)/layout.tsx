import type { ReactNode } from "react";
import { connection } from "next/server";

/** What needs the server. Made for each request, so that it can carry the nonce that its scripts are allowed by. */
export default async function AppLayout({ children }: { children: ReactNode }) {
  await connection();
  return children;
}
