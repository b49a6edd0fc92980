/**
 * A moment as the reader's calendar has it. Rendered in UTC's words on the server; the reader's own zone is not known there,
 * and a day is what the log is read by, so days are given and the exact moment stands in the title.
 */
export function Day({ at }: { at: string }) {
  return (
    <time dateTime={at} title={at.replace("T", " ").replace(/(\.\d+)?Z$/, " UTC")} className="whitespace-nowrap">
      {new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short", year: "numeric", timeZone: "UTC" }).format(new Date(at))}
    </time>
  );
}
