import type { Handler } from "@/lib/server/web/endpoint";
import { openapi } from "@/lib/server/web/openapi";
import { publicEndpoint } from "@/lib/server/web/personal-endpoint";
import { routes } from "../routes";

export const GET: Handler = publicEndpoint({
  permission: "anyone",
  summary: "This API, described",
  run: async (): Promise<Response> =>
    Response.json(openapi({ ...routes, "/openapi.json": { GET } }), { headers: { "cache-control": "public, max-age=300" } }),
});
