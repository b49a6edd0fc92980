import * as z from "zod";
import { StoredFile } from "@/lib/core/contract/file";
import { Id } from "@/lib/core/contract/id";
import { keepFile } from "@/lib/server/files/commands";
import { MAX_UPLOAD_BYTES } from "@/lib/server/files/picture";
import { readFile } from "@/lib/server/files/queries";
import { endpoint, slowEndpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id, fileId: Id });

export const GET = endpoint({
  permission: "file:read",
  summary: "A photo",
  params,
  run: (scope, { params }) => readFile(scope, params.fileId),
});

export const PUT = slowEndpoint({
  permission: "file:write",
  summary: "Keep a photo; it is encoded anew",
  params,
  raw: { accepts: ["image/jpeg", "image/png", "image/webp", "image/heic", "application/octet-stream"], maxBytes: MAX_UPLOAD_BYTES },
  output: StoredFile,
  run: (pass, { params, bytes }) => keepFile(pass, params.fileId, bytes.body),
});
