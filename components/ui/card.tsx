import { clsx } from "clsx";
import type { ComponentProps } from "react";

/** A sheet of paper on the chart table. */
export function Card({ className, ...rest }: ComponentProps<"section">) {
  return <section className={clsx("min-w-0 rounded-xl border border-rule bg-sheet px-4 py-4 sm:px-5", className)} {...rest} />;
}
