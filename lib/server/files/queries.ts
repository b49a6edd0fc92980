import "server-only";
import { and, eq } from "drizzle-orm";
import { files } from "@/db/schema/files";
import type { StoredFile } from "@/lib/core/contract/file";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { objectStore } from "./object-store";

type Row = typeof files.$inferSelect;

/** A photo's bytes, as an answer that no browser will run or guess at. The address of a photo always means the same photo, so it may be kept; by this person's browser, for this person only. */
export async function readFile(scope: FleetScope<"file:read">, id: string): Promise<Response> {
  const row = await findFile(scope, id);
  const stored = row && (await objectStore().get(storeKey(row)));
  if (!row || !stored) throw Problem.notFound();
  return new Response(stored.body, {
    headers: {
      "content-type": row.mediaType,
      "content-length": String(stored.size),
      "content-disposition": `inline; filename="${id}.jpg"`,
      "content-security-policy": "default-src 'none'; sandbox",
      "cross-origin-resource-policy": "same-origin",
      "x-content-type-options": "nosniff",
      "cache-control": "private, max-age=86400, immutable",
      // A browser may be signed in as somebody else tomorrow.
      vary: "cookie",
    },
  });
}

export async function findFile(scope: FleetScope, id: string): Promise<Row | null> {
  const [row] = await scope.tx
    .select()
    .from(files)
    .where(and(eq(files.fleetId, scope.fleetId), eq(files.id, id)));
  return row ?? null;
}

/** Where a file's bytes are: under its fleet, so that a fleet's files can be moved and deleted together; with its hash, so that two photos sent at once under one id cannot write over each other. */
export const storeKey = (file: Pick<Row, "fleetId" | "id" | "sentHash">) => `${file.fleetId}/${file.id}-${file.sentHash.slice(0, 16)}.jpg`;

export function storedFileOf(row: Row): StoredFile {
  return {
    id: row.id,
    mediaType: "image/jpeg",
    bytes: row.bytes,
    widthPx: row.widthPx,
    heightPx: row.heightPx,
    createdAt: row.createdAt.toISOString(),
  };
}
