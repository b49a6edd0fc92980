"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Fold } from "@/components/ui/fold";
import { TextField } from "@/components/ui/text-field";
import { useHere } from "./here";
import { useStepDue } from "./step-due";

/** A tool or a part that is not aboard: the checks and repairs that need it are then left alone. */
export function NotAboard({ onSaid }: { onSaid: () => void }) {
  const { record, setUndo } = useHere();
  const due = useStepDue();
  const [words, setWords] = useState("");
  const say = (item: string) => {
    void record("not-aboard", { item }).then((event) => setUndo({ event: event.id, says: `Not aboard: ${item}`, withdraws: null }));
    onSaid();
  };
  const items = due ? [...due.tools, ...due.parts.map(({ title }) => title)] : [];
  return (
    <Fold title="A tool or part is not aboard">
      <div className="grid gap-2">
        {items.map((item) => (
          <Button key={item} wide onClick={() => say(item)}>
            {item}
          </Button>
        ))}
        <TextField id="not-aboard" label="Another thing" value={words} maxLength={200} onChange={(event) => setWords(event.target.value)} />
        <Button wide disabled={words.trim() === ""} onClick={() => say(words.trim())}>
          Not aboard
        </Button>
      </div>
    </Fold>
  );
}
