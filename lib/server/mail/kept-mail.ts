import "server-only";
import { readdir, readFile } from "node:fs/promises";
import path from "node:path";
import * as z from "zod";

export type KeptMail = { id: string; at: string; to: string; subject: string; text: string };

const Kept = z.object({ to: z.string().default(""), subject: z.string().default(""), text: z.string().default("") });
const SHOWN = 50;

/**
 * The mails that the local mailbox has kept, newest first; null where there is none, because mail goes out for real.
 * Only the start, dev and test commands set MAIL_DIR.
 */
export async function listKeptMail(): Promise<KeptMail[] | null> {
  const dir = process.env.MAIL_DIR;
  if (!dir) return null;
  const names = await readdir(/* turbopackIgnore: true */ dir).catch(() => []);
  const newest = names
    .filter((name) => /^\d+-\d+\.json$/.test(name))
    .sort()
    .reverse()
    .slice(0, SHOWN);
  const mails = await Promise.all(newest.map((name) => read(path.join(/* turbopackIgnore: true */ dir, name), name)));
  return mails.filter((mail) => mail !== null);
}

/** null for one that is being written at this moment. */
async function read(file: string, name: string): Promise<KeptMail | null> {
  try {
    const mail = Kept.parse(JSON.parse(await readFile(/* turbopackIgnore: true */ file, "utf8")));
    return { id: name.replace(".json", ""), at: new Date(Number(name.split("-")[0])).toISOString(), ...mail };
  } catch {
    return null;
  }
}
