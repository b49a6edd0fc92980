import type { ReactNode } from "react";

type Props = { title: ReactNode; under?: ReactNode; action?: ReactNode; back?: ReactNode };

/** What this page is about, in one line, and the one thing most people come to do here. */
export function PageHead({ title, under, action, back }: Props) {
  return (
    <div className="mb-5">
      {back && <p className="mb-1 text-sm">{back}</p>}
      <div className="flex flex-wrap items-start justify-between gap-3">
        <div className="min-w-0 flex-1 basis-80">
          <h1 className="text-3xl">{title}</h1>
          {under && <p className="mt-1 text-ink-2">{under}</p>}
        </div>
        {action && <div className="no-print">{action}</div>}
      </div>
    </div>
  );
}
