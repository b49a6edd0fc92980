import { connection } from "next/server";
import { NothingHere } from "@/components/shell/nothing-here";
import { PlainFrame } from "@/components/shell/plain-frame";
import { LinkButton } from "@/components/ui/link-button";

export default async function NoSuchPage() {
  // Made for each request, so that it can carry the nonce that its scripts are allowed by.
  await connection();
  return (
    <PlainFrame>
      <NothingHere action={<LinkButton href="/">To the front page</LinkButton>} />
    </PlainFrame>
  );
}
