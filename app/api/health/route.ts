import { isHealthy } from "@/lib/server/web/health";

export const dynamic = "force-dynamic";

export async function GET(): Promise<Response> {
  const healthy = await isHealthy();
  return Response.json({ healthy }, { status: healthy ? 200 : 503, headers: { "cache-control": "no-store" } });
}
