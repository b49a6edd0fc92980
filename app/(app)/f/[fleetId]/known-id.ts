import { notFound } from "next/navigation";
import { Id } from "@/lib/core/contract/id";

/** An id out of an address; what cannot be one of ours is not found, like one that is not. */
export function knownId(id: string): string {
  const parsed = Id.safeParse(id);
  if (!parsed.success) notFound();
  return parsed.data;
}
