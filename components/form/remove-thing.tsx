"use client";

import { useRouter } from "next/navigation";
import { useState, type ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { remove } from "@/lib/client/exchange/request";
import { useSave } from "./use-save";

type Props = {
  /** "Remove Corncrake" */
  title: string;
  path: string;
  version: number;
  /** Where to go when it is gone. */
  then: string;
  /** What goes and what stays. */
  children: ReactNode;
};

/** Takes a thing off the lists after saying in words what goes and what stays. */
export function RemoveThing({ title, path, version, then, children }: Props) {
  const router = useRouter();
  const [asks, setAsks] = useState(false);
  const { saving, refusal, save, forget } = useSave();
  const goOn = async () => {
    const outcome = await save(() => remove(path, version));
    if (!("answer" in outcome)) return;
    router.push(then);
    router.refresh();
  };
  const close = () => {
    setAsks(false);
    forget();
  };
  return (
    <>
      <Button tone="grave" onClick={() => setAsks(true)}>
        {title}
      </Button>
      <Dialog open={asks} onClose={close} title={`${title}?`}>
        <div className="grid gap-4">
          <div>{children}</div>
          {refusal && (
            <Notice tone="bad" live>
              {refusal.status === 412
                ? "Somebody changed it since you opened this page. Load the page again and look before you remove it."
                : refusal.says}
            </Notice>
          )}
          <div className="flex flex-wrap gap-3">
            <Button tone="grave" disabled={saving} onClick={() => void goOn()}>
              {saving ? "One moment…" : title}
            </Button>
            <Button onClick={close}>Leave it</Button>
          </div>
        </div>
      </Dialog>
    </>
  );
}
