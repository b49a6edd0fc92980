import { chmodSync, mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { listKeptMail } from "@/lib/server/mail/kept-mail";
import { sendMail } from "@/lib/server/mail/send-mail";
import { startMail } from "@/scripts/lib/mail.mjs";

let dir: string;
beforeEach(() => void (dir = mkdtempSync(path.join(os.tmpdir(), "mail-"))));
afterEach(() => {
  rmSync(dir, { recursive: true, force: true });
  delete process.env.MAIL_DIR;
});

test("where mail goes out for real there is no mailbox to show", async () => {
  delete process.env.MAIL_DIR;
  expect(await listKeptMail()).toBeNull();
});

test("what was sent is shown, newest first, and nothing else of the folder", async () => {
  process.env.MAIL_DIR = dir;
  chmodSync(dir, 0o755);
  let arrived = 0;
  const server = await startMail({ dir, onMail: () => void arrived++ });
  process.env.SMTP_URL = server.url;
  await sendMail("ada@example.test", { subject: "First", text: "One\n" });
  await sendMail("ben@example.test", { subject: "Second", text: "Two\n" });
  await expect.poll(() => arrived).toBe(2);
  await server.stop();
  for (const name of [".", ...readdirSync(dir)])
    expect(statSync(path.join(dir, name)).mode & 0o077, `${name} is for its owner alone`).toBe(0);
  writeFileSync(path.join(dir, "secrets.json"), "{}");
  writeFileSync(path.join(dir, "1-0001.json"), '{ "to": "half wri');
  const mails = await listKeptMail();
  expect(mails).toMatchObject([
    { to: "ben@example.test", subject: "Second", text: "Two\n" },
    { to: "ada@example.test", subject: "First", text: "One\n" },
  ]);
});

test("an address that would break a mail's header is not sent to", async () => {
  process.env.SMTP_URL = "smtp://127.0.0.1:1";
  for (const to of ["a@x.test\r\nBcc: b@x.test", '"a"@x.test', "a@x.test,b@x.test", "Ada <a@x.test>"]) {
    await expect(sendMail(to, { subject: "x", text: "x" })).rejects.toThrow(/not an address/);
  }
});
