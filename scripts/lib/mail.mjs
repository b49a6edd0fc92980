// A mail server for development and tests: it accepts every mail on loopback and keeps it in a folder.
import { chmodSync, mkdirSync, writeFileSync } from "node:fs";
import path from "node:path";
import { simpleParser } from "mailparser";
import { SMTPServer } from "smtp-server";

/** @param {{ dir: string, port?: number, onMail?: (mail: { to: string, subject: string, text: string, html?: string }) => void }} options */
export function startMail({ dir, port = 0, onMail = () => {} }) {
  mkdirSync(dir, { recursive: true });
  chmodSync(dir, 0o700); // links that sign people in
  let n = 0;
  const server = new SMTPServer({
    disabledCommands: ["AUTH", "STARTTLS"],
    disableReverseLookup: true,
    onData(stream, _session, done) {
      const chunks = [];
      stream.on("data", (c) => chunks.push(c));
      const keep = async () => {
        const raw = Buffer.concat(chunks);
        const mail = await simpleParser(raw);
        const record = { to: mail.to?.text, subject: mail.subject, text: mail.text, html: mail.html || undefined };
        const base = path.join(dir, `${Date.now()}-${String(++n).padStart(4, "0")}`);
        writeFileSync(`${base}.eml`, raw, { mode: 0o600 });
        writeFileSync(`${base}.json`, JSON.stringify(record, null, 2), { mode: 0o600 });
        onMail(record);
      };
      stream.on("end", () => keep().then(() => done(), done));
    },
  });
  return new Promise((resolve, reject) => {
    server.on("error", reject);
    server.listen(port, "127.0.0.1", () => {
      const actual = server.server.address().port;
      resolve({ port: actual, url: `smtp://127.0.0.1:${actual}`, stop: () => new Promise((r) => server.close(() => r())) });
    });
  });
}
