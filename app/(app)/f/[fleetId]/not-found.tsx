import { NothingHere } from "@/components/shell/nothing-here";
import { LinkButton } from "@/components/ui/link-button";

export const metadata = { title: "Nothing here" };

export default function NotInThisFleet() {
  return <NothingHere action={<LinkButton href="/account">To your fleets</LinkButton>} />;
}
