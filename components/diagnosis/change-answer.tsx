"use client";

import { BackLink } from "./back-link";
import { useHere } from "./here";
import { ScreenHeading } from "./screen-heading";
import { Told } from "./told";

/** Another answer in the place of one that was given. */
export function ChangeAnswer() {
  const { address, tree, view, thinking } = useHere();
  const said = view.said.find((one) => one.event === address.which);
  const check = said?.kind === "answered" ? tree.checks.find(({ key }) => key === said.key) : undefined;
  const remedy = said?.kind === "remedy-tried" ? tree.remedies.find(({ key }) => key === said.key) : undefined;
  if (check) return <Told node={{ check }} />;
  if (remedy) return <Told node={{ remedy }} />;
  if (thinking) return <p role="status">One moment.</p>;
  return (
    <>
      <BackLink />
      <ScreenHeading of="change">This answer is not here any more</ScreenHeading>
      <p className="mt-2">It was changed or taken back. The others stay as they are.</p>
    </>
  );
}
