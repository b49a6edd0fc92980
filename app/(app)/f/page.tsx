import { redirect } from "next/navigation";
import { fleetsOf } from "@/lib/server/people/queries";
import { signedInPerson } from "@/lib/server/web/page-scope";

/** Home: the fleet one joined first; the account page for somebody who is in none. */
export default async function HomePage() {
  const [first] = await fleetsOf(await signedInPerson("/f"));
  redirect(first ? `/f/${first.id}` : "/account");
}
