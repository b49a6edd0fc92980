import type { Metadata } from "next";
import { Diagnose } from "@/components/diagnosis/diagnose";

export const metadata: Metadata = { title: "Diagnose" };

/** One static page: everything on it comes from the phone's own store, so that it is the same with and without a network. */
export default function DiagnosePage() {
  return <Diagnose />;
}
