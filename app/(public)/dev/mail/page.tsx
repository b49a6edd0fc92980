import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { Moment } from "@/components/log/moment";
import { EmptyState } from "@/components/ui/empty-state";
import { PageHead } from "@/components/ui/page-head";
import { listKeptMail } from "@/lib/server/mail/kept-mail";

export const metadata: Metadata = { title: "Mail that was sent" };

/** Only where mail stays on this machine: what was sent, newest first. */
export default async function KeptMailPage() {
  const mails = await listKeptMail();
  if (!mails) notFound();
  return (
    <>
      <PageHead title="Mail that was sent" under="It stays on this machine. Newest first." />
      {mails.length === 0 ? (
        <EmptyState title="No mail yet">Invitations, sign-in links and resets land here.</EmptyState>
      ) : (
        <ul className="grid gap-4">
          {mails.map((mail) => (
            <li key={mail.id} className="rounded-xl border border-rule bg-sheet px-4 py-3">
              <h2 className="text-lg">{mail.subject}</h2>
              <p className="text-sm text-ink-2">
                To <span className="break-all">{mail.to}</span>, <Moment at={mail.at} />
              </p>
              <p className="mt-2 whitespace-pre-wrap">
                <Linked text={mail.text} />
              </p>
            </li>
          ))}
        </ul>
      )}
    </>
  );
}

/** Addresses in the text as links. */
function Linked({ text }: { text: string }) {
  return text.split(/(https?:\/\/\S+)/).map((part, i) =>
    i % 2 === 1 ? (
      <a key={i} className="link break-all" href={part}>
        {part}
      </a>
    ) : (
      part
    ),
  );
}
