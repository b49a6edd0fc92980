"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { LightSwitch } from "@/components/ui/light-switch";
import { onDeep } from "./on-deep";
import { Dialog } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { NoAnswer, remove, request } from "@/lib/client/exchange/request";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { FaultTree } from "@/lib/core/tree/schema";

type Props = { fleetId: string; bench: Workbench };

/** Take the draft along, bring a tree in, give the draft up. */
export function MoreMenu({ fleetId, bench }: Props) {
  const router = useRouter();
  const [open, setOpen] = useState(false);
  const [sure, setSure] = useState(false);
  const [says, setSays] = useState<{ tone: "good" | "bad"; lines: readonly string[] } | null>(null);
  const file = useRef<HTMLInputElement>(null);
  const path = `/api/v1/fleets/${fleetId}/trees`;
  const bring = async (picked: File) => {
    const json = picked.name.endsWith(".json");
    try {
      const answer = (await request(`${path}/reading`, {
        method: "POST",
        headers: { "content-type": json ? "application/json" : "application/yaml" },
        body: await picked.text(),
      })) as { document: unknown };
      bench.edit(FaultTree.parse(answer.document), `${picked.name} brought in`);
      setSays({ tone: "good", lines: [`${picked.name} is in the draft now. Undo takes it back.`] });
    } catch (failure) {
      const refusal = failure instanceof NoAnswer ? failure : null;
      setSays({
        tone: "bad",
        lines: refusal?.errors.length
          ? refusal.errors.slice(0, 12).map((one) => `${one.path}: ${one.says}`)
          : [refusal?.because ?? "This file could not be read as a tree."],
      });
    }
  };
  const giveUp = async () => {
    setSure(false);
    const { id, version } = bench.session.get().saved;
    try {
      await remove(`${path}/draft?draft=${id}`, version);
      await bench.forget();
      router.push(`/f/${fleetId}/trees`);
      router.refresh();
    } catch (failure) {
      const isStale = failure instanceof NoAnswer && failure.status === 412 && bench.takeIn(failure.current);
      setSays({
        tone: "bad",
        lines: [isStale ? "Somebody saved the draft just now. Look at it before you give it up." : "It could not be given up now."],
      });
    }
  };
  return (
    <>
      <button type="button" className={onDeep()} onClick={() => setOpen(true)}>
        More
      </button>
      <Dialog open={open} onClose={() => setOpen(false)} title="The whole draft">
        <div className="grid gap-5">
          <LightSwitch />
          {says && (
            <Notice tone={says.tone} live>
              <ul>
                {says.lines.map((line, index) => (
                  <li key={index}>{line}</li>
                ))}
              </ul>
            </Notice>
          )}
          <section className="grid gap-2">
            <h3>Take it along</h3>
            <p className="flex flex-wrap gap-4">
              {(["yaml", "json"] as const).map((format) => (
                <a key={format} className="link inline-flex min-h-12 items-center" href={`${path}/draft/file?format=${format}`} download>
                  As {format.toUpperCase()}
                </a>
              ))}
            </p>
          </section>
          <section className="grid gap-2">
            <h3>Bring a tree in</h3>
            <p className="text-sm text-ink-2">
              A YAML or JSON file as it was taken along. It takes the place of what the draft says; undo takes it back.
            </p>
            <input
              ref={file}
              type="file"
              accept=".yaml,.yml,.json"
              className="hidden"
              aria-hidden
              tabIndex={-1}
              onChange={(event) => {
                const picked = event.target.files?.[0];
                if (picked) void bring(picked);
                event.target.value = "";
              }}
            />
            <div>
              <Button onClick={() => file.current?.click()}>Choose a file</Button>
            </div>
          </section>
          <section className="grid gap-2">
            <h3>Give the draft up</h3>
            <p className="text-sm text-ink-2">
              Everything changed since the version in use is thrown away, for everybody. Take it along first if you are not sure.
            </p>
            <div>
              {sure ? (
                <div className="flex flex-wrap gap-3">
                  <Button tone="grave" onClick={() => void giveUp()}>
                    Throw it away for everybody
                  </Button>
                  <Button onClick={() => setSure(false)}>Keep it</Button>
                </div>
              ) : (
                <Button tone="grave" onClick={() => setSure(true)}>
                  Give it up
                </Button>
              )}
            </div>
          </section>
        </div>
      </Dialog>
    </>
  );
}
