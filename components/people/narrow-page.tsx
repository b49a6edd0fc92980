import type { ReactNode } from "react";

/** A page that asks one thing. */
export function NarrowPage({ title, under, children }: { title: string; under?: ReactNode; children: ReactNode }) {
  return (
    <div className="mx-auto max-w-md">
      <h1 className="text-3xl">{title}</h1>
      {under && <p className="mt-1 text-ink-2">{under}</p>}
      <div className="mt-5">{children}</div>
    </div>
  );
}
