import { NothingHere } from "@/components/shell/nothing-here";
import { PlainFrame } from "@/components/shell/plain-frame";
import { LinkButton } from "@/components/ui/link-button";

export const metadata = { title: "Nothing here" };

export default function NotYours() {
  return (
    <PlainFrame>
      <NothingHere action={<LinkButton href="/account">To your fleets</LinkButton>} />
    </PlainFrame>
  );
}
