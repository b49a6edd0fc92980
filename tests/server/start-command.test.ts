import { spawn } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { isForThisMachine } from "@/scripts/lib/own-machine.mjs";
import { alive } from "@/scripts/lib/proc.mjs";
import { SOCKET_ADDRESS } from "@/scripts/lib/serve.mjs";

const scripts = path.resolve(import.meta.dirname, "../../scripts/lib");
const dir = mkdtempSync(path.join(os.tmpdir(), "start-"));
afterAll(() => rmSync(dir, { recursive: true, force: true }));

/** A Node process that runs this; `said` is what it printed once it has ended. */
function node(program: string) {
  const child = spawn(process.execPath, ["--input-type=module", "-e", program], { stdio: ["ignore", "pipe", "inherit"] });
  let out = "";
  child.stdout.on("data", (data) => (out += data));
  const said = new Promise<string>((resolve) => child.once("close", () => resolve(out.trim())));
  return { child, said, sofar: () => out };
}

const claimant = (file: string, ms: number) => `
  import { takeLock } from "${scripts}/lock-file.mjs";
  const held = takeLock(${JSON.stringify(file)});
  console.log(held ? "held" : "mine");
  setTimeout(() => {}, ${ms});`;

describe("a lock", () => {
  test("whose holder was killed is taken over, by one of many that try", async () => {
    const file = path.join(dir, "dead.lock");
    const first = node(claimant(file, 60_000));
    await expect.poll(first.sofar, { timeout: 10_000 }).toContain("mine");
    first.child.kill("SIGKILL");
    await first.said;
    const many = Array.from({ length: 6 }, () => node(claimant(file, 3000)));
    expect((await Promise.all(many.map((one) => one.said))).sort()).toEqual([...Array<string>(5).fill("held"), "mine"]);
  });

  test.each(["", "not JSON", "{}", '{"tag":"1:1"}', '{"tag":7}'])("that says %j is nobody's", async (left) => {
    const file = path.join(dir, "left.lock");
    writeFileSync(file, left);
    expect(await node(claimant(file, 0)).said).toBe("mine");
    expect(JSON.parse(readFileSync(file, "utf8"))).toHaveProperty("tag");
    rmSync(file);
  });
});

test.runIf(process.platform === "linux")("what is being run when the start command is killed ends with it", async () => {
  const pidFile = path.join(dir, "pid");
  const runner = node(`
    import { run } from "${scripts}/proc.mjs";
    await run("sh", ["-c", "echo $$ > ${pidFile}; exec sleep 60"]);`);
  const pid = () => {
    try {
      return Number(readFileSync(pidFile, "utf8"));
    } catch {
      return 0;
    }
  };
  await expect.poll(pid, { timeout: 10_000 }).toBeGreaterThan(0);
  runner.child.kill("SIGKILL");
  await expect.poll(() => alive(pid()), { timeout: 5000 }).toBe(false);
});

describe("a command that fails on the way to a running site", () => {
  const ran = (shell: string) =>
    node(`
      import { runOrSay, UserError } from "${scripts}/proc.mjs";
      await runOrSay("sh", ["-c", ${JSON.stringify(shell)}], { failed: "The site could not be built", whatToDo: "Mend it, then start again." })
        .then(() => console.log("fine"), (e) => console.log(e instanceof UserError ? e.message : "stack"));`).said;

  test("is told in plain words, with its own last lines and what to do, and without a stack", async () => {
    const said = await ran(
      "for i in $(seq 60); do echo line $i; done; printf '\\033[31mapp/page.tsx:3 no such name\\033[0m\\n' >&2; exit 3",
    );
    expect(said).toMatch(/^The site could not be built \(exit code 3\)\./);
    expect(said).toContain("\n  line 60\n");
    expect(said).toContain("\n  app/page.tsx:3 no such name\n");
    expect(said).not.toContain("line 30\n");
    expect(said).toMatch(/Mend it, then start again\.$/);
    expect(said).not.toMatch(/^\s+at /m);
  });

  test("says so where it printed nothing, was ended, or went well", async () => {
    expect(await ran("exit 1")).toContain("It said nothing.");
    expect(await ran("kill -9 $$")).toContain("(it was ended by SIGKILL)");
    expect(await ran("echo built")).toBe("fine");
  });
});

describe("where a request comes from", () => {
  const seen = async (trusted: string | undefined) => {
    const child = spawn(
      process.execPath,
      [
        ...SOCKET_ADDRESS,
        "--input-type=module",
        "-e",
        `import http from "node:http";
         const server = http.createServer((request, response) => response.end(JSON.stringify(request.headers["x-forwarded-for"] ?? null)));
         server.listen(0, "127.0.0.1", () => console.log(server.address().port));`,
      ],
      { stdio: ["ignore", "pipe", "inherit"], env: { ...process.env, TRUSTED_PROXIES: trusted } },
    );
    const port = await new Promise<string>((resolve) => child.stdout.once("data", (data) => resolve(String(data).trim())));
    const ask = async (headers: Record<string, string>) => (await fetch(`http://127.0.0.1:${port}`, { headers })).json();
    const answers = [await ask({ "x-forwarded-for": "6.6.6.6" }), await ask({})];
    child.kill();
    return answers;
  };

  test("without a proxy is what its socket says, whatever the caller writes into X-Forwarded-For", async () => {
    expect(await seen(undefined)).toEqual(["127.0.0.1", "127.0.0.1"]);
  });

  test("behind a proxy is what the proxy wrote", async () => {
    expect(await seen("1")).toEqual(["6.6.6.6", null]);
  });
});

describe("the mail that was sent is shown", () => {
  test.each([
    ["127.0.0.1", "http://localhost:3000", true],
    ["::1", "http://[::1]:3000", true],
    ["0.0.0.0", "http://localhost:3000", false],
    ["192.168.1.5", "http://localhost:3000", false],
    ["127.0.0.1", "https://boats.example", false],
  ])("with the site on %s, known as %s: %s", (host, url, shown) => expect(isForThisMachine(host, url)).toBe(shown));
});
