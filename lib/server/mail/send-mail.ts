import "server-only";
import { createTransport, type Transporter } from "nodemailer";

export type Letter = { subject: string; text: string };

/** Somebody waits for the answer meanwhile: the library's own patience is ten minutes. */
const PATIENCE_MS = "10000";

function withPatience(url: string): string {
  const patient = new URL(url);
  for (const name of ["connectionTimeout", "greetingTimeout", "socketTimeout", "dnsTimeout"])
    if (!patient.searchParams.has(name)) patient.searchParams.set(name, PATIENCE_MS);
  return patient.toString();
}

const transports = new Map<string, Transporter>();

function transport(): Transporter {
  const url = process.env.SMTP_URL;
  if (!url) throw new Error("SMTP_URL is not set: mail cannot be sent.");
  const known = transports.get(url);
  if (known) return known;
  const made = createTransport(withPatience(url), { from: process.env.MAIL_FROM ?? "Gudgeon <no-reply@localhost>" });
  transports.set(url, made);
  return made;
}

/** Sends one letter to one address, in plain text. The address has been through Email already; here a second look, because a header is where it ends up. */
export async function sendMail(to: string, letter: Letter): Promise<void> {
  if (!/^[\x21-\x7e]+@[\x21-\x7e]+$/.test(to) || /["<>(),;:\\]/.test(to)) throw new Error("not an address that mail can be sent to");
  await transport().sendMail({ to: { name: "", address: to }, subject: letter.subject.replace(/[\r\n]+/g, " "), text: letter.text });
}

/** An address of this site, for a letter. */
export const siteUrl = (path: string): string => new URL(path, process.env.AUTH_URL ?? "http://localhost:3000").toString();
