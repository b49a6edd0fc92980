import "server-only";
import { createHash } from "node:crypto";
import { sum, eq } from "drizzle-orm";
import { files } from "@/db/schema/files";
import type { StoredFile } from "@/lib/core/contract/file";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope, Pass } from "@/lib/server/auth/scope";
import { objectStore } from "./object-store";
import { readPicture, type Picture } from "./picture";
import { findFile, storedFileOf, storeKey } from "./queries";

/** Some 10 000 photos of the usual size. */
const FLEET_BYTES = 4_000_000_000;

const STATUS = { "too-large": 413, heic: 415, "not-a-picture": 415, "too-many-pixels": 422, damaged: 422 } as const;

/**
 * Keeps a photo under the id that the phone gave it. Sent twice it is one photo. It is encoded and put away between
 * transactions: neither a large picture nor a slow store holds a connection.
 *
 * @throws Problem 413, 415 or 422 for what is too large, no picture, or damaged; 409 for another photo under the same id
 */
export async function keepFile(pass: Pass<"file:write">, id: string, bytes: Uint8Array): Promise<StoredFile> {
  const sentHash = createHash("sha256").update(bytes).digest("hex");
  const there = await pass.enter((scope) => findSame(scope, id, sentHash));
  if (there) return there;
  const picture = await readPicture(bytes);
  if ("refused" in picture) throw new Problem(STATUS[picture.refused], picture.refused, "That picture cannot be kept", picture.says);
  const key = await pass.enter(async (scope) => {
    await refuseFull(scope, picture);
    return storeKey({ fleetId: scope.fleetId, id, sentHash });
  });
  // Bytes first: a row without bytes would be a broken photo, bytes without a row are only waste, which the next try writes over.
  await objectStore().put(key, picture.body, picture.type);
  return pass.enter((scope) => writeRow(scope, { id, sentHash, picture }));
}

async function findSame(scope: FleetScope, id: string, sentHash: string): Promise<StoredFile | null> {
  const there = await findFile(scope, id);
  if (there && there.sentHash !== sentHash) throw Problem.conflict("Another photo has this id already.");
  return there && storedFileOf(there);
}

async function refuseFull(scope: FleetScope, picture: Picture): Promise<void> {
  const [used] = await scope.tx
    .select({ bytes: sum(files.bytes) })
    .from(files)
    .where(eq(files.fleetId, scope.fleetId));
  if (Number(used?.bytes ?? 0) + picture.body.byteLength > FLEET_BYTES) {
    throw new Problem(507, "fleet-full", "There is no room left for photos", "This fleet has used up its 4 GB. Go on without the photo.");
  }
}

type Kept = { id: string; sentHash: string; picture: Picture };

async function writeRow(scope: FleetScope<"file:write">, { id, sentHash, picture }: Kept): Promise<StoredFile> {
  const [row] = await scope.tx
    .insert(files)
    .values({
      fleetId: scope.fleetId,
      id,
      mediaType: picture.type,
      bytes: picture.body.byteLength,
      widthPx: picture.width,
      heightPx: picture.height,
      sentHash,
      by: scope.actor.userId,
    })
    .onConflictDoNothing()
    .returning();
  const kept = row ? storedFileOf(row) : await findSame(scope, id, sentHash);
  if (!kept) throw new Error("a photo was neither kept nor there");
  return kept;
}
