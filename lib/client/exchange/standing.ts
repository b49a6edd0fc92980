/** How the phone and the server stand to each other. */
export type Standing = {
  /** Events and photos that the server does not have. */
  waiting: number;
  sending: boolean;
  trouble: "no-signal" | "sign-in" | "not-in-fleet" | "server" | "full" | "too-new" | null;
  /** When the server last had everything; null: not since this phone was opened. */
  ashoreAt: string | null;
};

export const NOTHING_YET: Standing = { waiting: 0, sending: false, trouble: null, ashoreAt: null };

/** The short form for the header; true at any moment, and never a promise. */
export function standingInShort(standing: Standing, unsaved: boolean): string {
  if (unsaved) return "Not saved on this phone";
  if (standing.sending && standing.waiting > 0) return `Sending ${standing.waiting}`;
  if (standing.trouble === "no-signal") return "No signal: kept here";
  if (standing.trouble === "full") return "Photos kept here";
  if (standing.waiting > 0) return `Kept here: ${standing.waiting} to send`;
  if (standing.trouble === "sign-in") return "Signed out: kept here";
  if (standing.trouble !== null) return "Kept here";
  return standing.ashoreAt ? `Kept ashore ${clock(standing.ashoreAt)}` : "Kept on this phone";
}

/** The whole sentence, for the line under the screen. */
export function standingInWords(standing: Standing, unsaved: boolean): string {
  if (unsaved)
    return "The last answer is not saved on this phone. Its storage may be full. Keep this page open; it is tried again with the next answer.";
  const waiting = standing.waiting === 1 ? "1 entry waits" : `${standing.waiting} entries wait`;
  switch (standing.trouble) {
    case "no-signal":
      return standing.waiting > 0
        ? `No signal. All is kept on this phone; ${waiting} to be sent.`
        : "No signal. All is kept on this phone.";
    case "sign-in":
      return `You are signed out. All is kept on this phone${standing.waiting > 0 ? `; ${waiting} until you sign in` : ""}.`;
    case "not-in-fleet":
      return "The server says you do not belong to this fleet now. All is kept on this phone.";
    case "server":
      return `The server did not take it this time. All is kept on this phone${standing.waiting > 0 ? `; ${waiting} to be sent` : ""}.`;
    case "full":
      return "The answers are kept ashore. There is no room left there for photos: they are kept on this phone and tried again in an hour. Tell the fleet\u2019s owner.";
    case "too-new":
      return "The fault tree ashore is newer than this page can read. The one on this phone is used. Load the page again while there is a signal.";
    case null:
      if (standing.waiting > 0) return `Kept on this phone; ${waiting} to be sent.`;
      return standing.ashoreAt ? `Everything is kept ashore, last at ${clock(standing.ashoreAt)}.` : "Kept on this phone.";
  }
}

function clock(moment: string): string {
  const at = new Date(moment);
  return `${String(at.getHours()).padStart(2, "0")}:${String(at.getMinutes()).padStart(2, "0")}`;
}
