import { mkdtempSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterAll } from "vitest";
import { startMail } from "../../scripts/lib/mail.mjs";

export type ReceivedMail = { to: string; subject: string; text: string };

/** A mail server of this test file's own, which the server's mail goes to. */
export async function testMailbox(): Promise<{ mails: ReceivedMail[]; tokenFor(email: string, page: string): string; clear(): void }> {
  const dir = mkdtempSync(path.join(os.tmpdir(), "mail-"));
  const mails: ReceivedMail[] = [];
  const server = await startMail({ dir, onMail: (mail) => void mails.push(mail) });
  process.env.SMTP_URL = server.url;
  process.env.AUTH_URL = "http://localhost:3000";
  afterAll(async () => {
    await server.stop();
    rmSync(dir, { recursive: true, force: true });
  });
  return {
    mails,
    /** The token of the newest link to /page/... that was sent to this address. */
    tokenFor(email, page) {
      for (const mail of mails.filter((m) => m.to === email).reverse()) {
        const token = new RegExp(`http://localhost:3000/${page}/([A-Za-z0-9_-]+)`).exec(mail.text)?.[1];
        if (token) return token;
      }
      throw new Error(`no link to /${page} was sent to ${email}`);
    },
    clear: () => void (mails.length = 0),
  };
}
