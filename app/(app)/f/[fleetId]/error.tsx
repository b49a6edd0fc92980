"use client";

import { WentWrong } from "@/components/shell/went-wrong";

type Props = { error: Error & { digest?: string }; retry: () => void };

export default function FleetPageWentWrong({ error, retry }: Props) {
  return <WentWrong error={error} retry={retry} />;
}
