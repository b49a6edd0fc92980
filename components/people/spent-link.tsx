import { LinkButton } from "@/components/ui/link-button";
import { NarrowPage } from "./narrow-page";

/** A link that was used, or is too old. */
export function SpentLink({ again }: { again: { href: string; title: string } }) {
  return (
    <NarrowPage title="This link no longer works" under="It works once and for a short time. Nothing is lost.">
      <LinkButton tone="strong" href={again.href}>
        {again.title}
      </LinkButton>
    </NarrowPage>
  );
}
