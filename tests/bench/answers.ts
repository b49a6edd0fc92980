import { mkdtempSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { eq } from "drizzle-orm";
import { encode } from "next-auth/jwt";
import { uuidv7 } from "uuidv7";
import type { DiagnosisEvent } from "@/lib/core/contract/event";
import type { Engine } from "@/lib/core/contract/engine";
import { build } from "../../scripts/lib/build.mjs";
import { prepareDatabase } from "../../scripts/lib/database.mjs";
import { startPostgres } from "../../scripts/lib/postgres.mjs";
import { freePort, stop } from "../../scripts/lib/proc.mjs";
import { secrets } from "../../scripts/lib/secrets.mjs";
import { serve } from "../../scripts/lib/serve.mjs";

/**
 * What posting one answer costs over HTTP, beside a signed-in route that only says who is asking, measured turn about
 * in the same run against the production build and a PostgreSQL of its own.
 *
 *   npm run bench -- answers [--json]
 */
const DIAGNOSES = 30;
const ANSWERS = 15;
/** An answer is proved, kept, folded and projected into the log in one transaction; a few times a bare read is what that may cost. */
const BAR = 5;

const scratch = mkdtempSync(path.join(os.tmpdir(), "gudgeon-bench-"));
const database = await startPostgres({ dir: path.join(scratch, "postgres"), database: "gudgeon", ephemeral: true });
const { env, demo } = await prepareDatabase(database.url, { demo: true });
const site = await serve({
  dir: await build(),
  port: await freePort(),
  stdio: "ignore",
  env: { ...env, FILES_DIR: path.join(scratch, "files"), SMTP_URL: "smtp://127.0.0.1:9" },
});
try {
  const cookie = await sessionCookie(demo!.people[0]!.email);
  const ask = async <T>(route: string, init: RequestInit = {}): Promise<T> => {
    const response = await fetch(`${site.url}/api/v1/${route}`, {
      ...init,
      headers: { cookie, origin: site.url, "content-type": "application/json" },
    });
    if (!response.ok) throw new Error(`${route}: ${response.status} ${await response.text()}`);
    return (await response.json()) as T;
  };
  const { fleets } = await ask<{ fleets: { id: string }[] }>("me");
  const fleet = `fleets/${fleets[0]!.id}`;
  const [engine] = (await ask<{ items: Engine[] }>(`${fleet}/engines`)).items;
  const [version] = (await ask<{ items: { id: string }[] }>(`${fleet}/trees`)).items;
  const { document: tree } = await ask<{ document: { checks: { key: string; findings: { key: string }[] }[] } }>(
    `${fleet}/trees/versions/${version!.id}`,
  );

  const bare: number[] = [];
  const answers: number[] = [];
  for (let d = 0; d < DIAGNOSES; d++) {
    const diagnosisId = uuidv7();
    const device = uuidv7();
    let sequence = 0;
    const post = (event: Pick<DiagnosisEvent, "kind" | "payload">) =>
      ask<{ receipts: { result: string; because?: string }[] }>(`${fleet}/diagnoses/${diagnosisId}/events`, {
        method: "POST",
        body: JSON.stringify({
          events: [{ id: uuidv7(), diagnosisId, device, sequence: ++sequence, madeAt: new Date().toISOString(), seen: {}, ...event }],
        }),
      });
    await post({
      kind: "begun",
      payload: {
        engineId: engine!.id,
        treeVersionId: version!.id,
        profile: engine!.profile,
        situation: "alongside",
        person: "mechanic",
        symptoms: ["lost-top-end-rpm"],
        multipliers: [],
        coreVersion: 1,
      },
    });
    for (const check of tree.checks.slice(d, d + ANSWERS)) {
      bare.push(await timed(() => ask("me")));
      answers.push(
        await timed(async () => {
          const { receipts } = await post({
            kind: "answered",
            payload: { check: check.key, answer: { finding: check.findings[0]!.key }, photos: [] },
          });
          if (receipts[0]!.result !== "stored") throw new Error(receipts[0]!.because);
        }),
      );
    }
  }
  report(bare, answers);
} finally {
  await stop(site.child);
  await database.stop();
  rmSync(scratch, { recursive: true, force: true });
}

/** A session of the demo's owner, opened as sign-in opens one, and its cookie. */
async function sessionCookie(email: string): Promise<string> {
  Object.assign(process.env, env, secrets());
  const { identityDatabase, closePools } = await import("@/db/client");
  const { users } = await import("@/db/schema/users");
  const { openSession } = await import("@/lib/server/auth/sessions");
  const [user] = await identityDatabase().select({ id: users.id }).from(users).where(eq(users.email, email));
  const sid = await openSession(user!.id, "bench");
  await closePools();
  const name = "authjs.session-token";
  return `${name}=${await encode({ token: { sid }, secret: process.env.AUTH_SECRET!, salt: name })}`;
}

async function timed(work: () => Promise<unknown>): Promise<number> {
  const began = performance.now();
  await work();
  return performance.now() - began;
}

function quantile(values: readonly number[], q: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(q * sorted.length))]!;
}

function report(bare: readonly number[], answers: readonly number[]) {
  const rows = ([0.5, 0.99] as const).map((q) => {
    const [of, to] = [quantile(answers, q), quantile(bare, q)];
    return { figure: `answer.p${q * 100}RatioToBareRead`, value: of / to, answerMs: of, bareMs: to };
  });
  if (process.argv.includes("--json")) {
    for (const { figure, value } of rows) {
      const bar = figure.includes("p50") ? BAR : null;
      console.log(JSON.stringify({ figure, value: Number(value.toFixed(2)), bar, holds: bar === null ? null : value <= bar }));
    }
    return;
  }
  console.log(`${answers.length} answers posted, turn about with as many bare reads (GET /api/v1/me)`);
  console.table(
    rows.map((r) => ({
      figure: r.figure,
      "answer, ms": r.answerMs.toFixed(1),
      "bare, ms": r.bareMs.toFixed(1),
      ratio: r.value.toFixed(2),
    })),
  );
}
