import { ArrowLeft } from "lucide-react";
import Link from "next/link";

/** The way back up: to the page that this one hangs on. */
export function BackTo({ href, title }: { href: string; title: string }) {
  return (
    <Link href={href} prefetch={false} className="link no-print inline-flex min-h-12 items-center gap-1.5">
      <ArrowLeft aria-hidden size={18} />
      {title}
    </Link>
  );
}
