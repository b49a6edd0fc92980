"use client";

import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { Button } from "@/components/ui/button";
import { Choice } from "@/components/ui/choice";
import { Dialog } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { TextArea } from "@/components/ui/text-area";
import { NoAnswer, sendJson } from "@/lib/client/exchange/request";
import { useKeptForm } from "@/lib/client/screen/use-kept-form";
import { useObservable } from "@/lib/client/screen/use-observable";
import { unsaved } from "@/lib/client/workshop/draft-session";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { compareTrees } from "@/lib/core/tree/differences";
import { onDeep } from "./on-deep";
import type { Checked } from "./use-checked";
import { useVersion } from "./use-version";

type Props = { fleetId: string; bench: Workbench; checked: Checked; current: TreeVersionInfo };

/** Publishing is deliberate: what changed in words, a note, and only what is sound and proved. */
export function Publish({ fleetId, bench, checked, current }: Props) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button
        type="button"
        className={onDeep("bg-on-deep! text-deep! night:bg-transparent! night:text-on-deep!")}
        onClick={() => setOpen(true)}
      >
        Publish
      </button>
      <Dialog open={open} onClose={() => setOpen(false)} title="Publish the draft">
        {open && <PublishForm fleetId={fleetId} bench={bench} checked={checked} current={current} />}
      </Dialog>
    </>
  );
}

const NOT_SAVED = "The last changes are not saved yet. Publish when they are.";
/** Nobody publishes what they have not seen. */
const CAME_IN = "Somebody else's changes came in just now. Look at what changed, then publish.";

type Refusal = { says: string; errors: readonly { path: string; says: string }[] };

function PublishForm({ fleetId, bench, checked, current }: Props) {
  const router = useRouter();
  const session = useObservable(bench.session);
  const before = useVersion(fleetId, current.id);
  const [{ note }, change, dropNote] = useKeptForm(`gudgeon.publish.${session.saved.id}`, () => ({ note: "" }));
  const [accepted, setAccepted] = useState<ReadonlySet<string>>(new Set());
  const [working, setWorking] = useState(false);
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const differences = useMemo(() => (before ? compareTrees(before, session.tree) : null), [before, session.tree]);
  const errors = checked.flaws?.filter(({ severity }) => severity === "error") ?? [];
  const failing = checked.proved?.failing ?? [];
  const waits = session.collisions.length > 0;
  const publish = async () => {
    setWorking(true);
    setRefusal(null);
    await bench.saveNow();
    const { tree, saved } = bench.session.get();
    const wait = unsaved(bench.session.get()) ? NOT_SAVED : tree === session.tree ? null : CAME_IN;
    if (wait) {
      setWorking(false);
      return setRefusal({ says: wait, errors: [] });
    }
    try {
      await sendJson(
        `/api/v1/fleets/${fleetId}/trees/draft/publication`,
        { draft: saved.id, note: note.trim(), failing, accept: failing.filter((key) => accepted.has(key)) },
        { version: saved.version },
      );
      dropNote();
      await bench.forget();
      router.push(`/f/${fleetId}/trees`);
      router.refresh();
    } catch (failure) {
      setWorking(false);
      if (failure instanceof NoAnswer && failure.status === 412 && bench.takeIn(failure.current))
        return setRefusal({ says: CAME_IN, errors: [] });
      setRefusal(
        failure instanceof NoAnswer
          ? { says: failure.because, errors: failure.errors }
          : { says: "It could not be published.", errors: [] },
      );
    }
  };
  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void publish();
      }}
    >
      {errors.length > 0 && (
        <Notice
          tone="bad"
          title={errors.length === 1 ? "One error keeps it from being published" : `${errors.length} errors keep it from being published`}
        >
          <ul className="list-disc pl-5">
            {errors.slice(0, 5).map((flaw, index) => (
              <li key={index}>
                {flaw.node.kind} {flaw.node.key}: {flaw.says}
              </li>
            ))}
          </ul>
        </Notice>
      )}
      {waits && <Notice tone="look">Choose first where both of you changed the same field.</Notice>}
      <section>
        <h3>What changed from version {current.number}</h3>
        {differences === null ? (
          <p role="status">Comparing…</p>
        ) : differences.length === 0 ? (
          <p>Nothing.</p>
        ) : (
          <ul className="max-h-60 list-disc overflow-y-auto pl-5 text-sm">
            {differences.map(({ says }, index) => (
              <li key={index}>{says}</li>
            ))}
          </ul>
        )}
      </section>
      {failing.length > 0 && (
        <fieldset>
          <legend className="font-semibold">Known cases that fail: tick each one you have looked at</legend>
          {failing.map((key) => (
            <Choice
              key={key}
              checked={accepted.has(key)}
              onChange={() =>
                setAccepted((now) => (now.has(key) ? new Set([...now].filter((one) => one !== key)) : new Set([...now, key])))
              }
            >
              {session.tree.knownCases.find((one) => one.key === key)?.title ?? key}
            </Choice>
          ))}
        </fieldset>
      )}
      <TextArea
        id="publish-note"
        label="Note"
        hint="What was changed and why, for whoever reads the history."
        maxLength={1000}
        value={note}
        onChange={(event) => change({ note: event.target.value })}
      />
      {refusal && (
        <Notice tone="bad" live>
          <p>{refusal.says}</p>
          <ul className="list-disc pl-5">
            {refusal.errors.slice(0, 8).map((error, index) => (
              <li key={index}>
                {error.path}: {error.says}
              </li>
            ))}
          </ul>
        </Notice>
      )}
      <p className="text-sm text-ink-2">
        The next diagnosis of this fleet uses it. Those that have begun keep the version they began with.
      </p>
      <div>
        <Button
          type="submit"
          tone="strong"
          disabled={
            working ||
            waits ||
            errors.length > 0 ||
            note.trim() === "" ||
            checked.proved === null ||
            failing.some((key) => !accepted.has(key)) ||
            differences?.length === 0
          }
        >
          {working ? "One moment…" : checked.proved === null ? "Replaying the known cases…" : "Publish it"}
        </Button>
      </div>
    </form>
  );
}
