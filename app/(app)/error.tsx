"use client";

import { PlainFrame } from "@/components/shell/plain-frame";
import { WentWrong } from "@/components/shell/went-wrong";

type Props = { error: Error & { digest?: string }; retry: () => void };

export default function PageWentWrong({ error, retry }: Props) {
  return (
    <PlainFrame>
      <WentWrong error={error} retry={retry} />
    </PlainFrame>
  );
}
