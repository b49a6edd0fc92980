"use client";

import { useState, type ComponentProps, type ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { ActionForm } from "./action-form";

type Props = Pick<ComponentProps<typeof ActionForm>, "action" | "hidden"> & {
  /** The button that asks, and the one that does it. */
  title: string;
  /** What happens, and what stays. */
  children: ReactNode;
};

/** A deed that takes something away: says first what it does. */
export function ConfirmForm({ action, hidden, title, children }: Props) {
  const [asks, setAsks] = useState(false);
  const close = () => setAsks(false);
  return (
    <>
      <Button tone="grave" onClick={() => setAsks(true)}>
        {title}
      </Button>
      <Dialog open={asks} onClose={close} title={`${title}?`}>
        <div className="mb-4">{children}</div>
        <ActionForm
          action={action}
          hidden={hidden ?? {}}
          submit={title}
          tone="grave"
          changesPage
          also={<Button onClick={close}>Leave it</Button>}
        />
      </Dialog>
    </>
  );
}
