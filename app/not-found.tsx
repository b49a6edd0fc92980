import { NothingHere } from "@/components/shell/nothing-here";
import { PlainFrame } from "@/components/shell/plain-frame";
import { LinkButton } from "@/components/ui/link-button";

export const metadata = { title: "Nothing here" };

/** Made when Gudgeon is built: one page made for each request would make every page so, the skipper's surface too. */
export default function NoSuchPage() {
  return (
    <PlainFrame>
      <NothingHere action={<LinkButton href="/">To the front page</LinkButton>} />
    </PlainFrame>
  );
}
