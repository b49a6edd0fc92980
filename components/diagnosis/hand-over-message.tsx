"use client";

import { useState } from "react";
import type { HandOverFacts } from "@/lib/client/hand-over/facts";
import { handOverMessage, messageLength } from "@/lib/client/hand-over/message";
import { smsLink } from "@/lib/client/hand-over/sms-link";
import { useKeptForm } from "@/lib/client/screen/use-kept-form";
import { Button } from "@/components/ui/button";
import { LinkButton } from "@/components/ui/link-button";
import { TextArea } from "@/components/ui/text-area";
import { TextField } from "@/components/ui/text-field";
import { useHere } from "./here";

/** About as many letters as a line holds on a narrow phone. */
const LETTERS_A_LINE = 30;

/** The same as a text message, which gets through where nothing else does. It can be altered before it is sent. */
export function HandOverMessage({ facts }: { facts: HandOverFacts }) {
  const { phone } = useHere();
  const [own, setOwn] = useState<string | null>(null);
  const [copied, setCopied] = useState("");
  const [{ number }, change] = useKeptForm(`gudgeon.help-number.${phone.fleet.id}`, () => ({ number: "" }));
  const text = own ?? handOverMessage(facts);
  const { characters, messages } = messageLength(text);
  const copy = async () => {
    try {
      // Not there at all where the address is not a secure one.
      await navigator.clipboard.writeText(text);
      setCopied("Copied.");
    } catch {
      setCopied("The browser would not copy it. Select the text and copy it by hand.");
    }
  };
  return (
    <section aria-label="As a text message" className="grid gap-3 break-inside-avoid">
      <div className="no-print">
        <TextArea
          id="message"
          label="As a text message"
          rows={Math.max(4, Math.ceil(text.length / LETTERS_A_LINE) + 1)}
          className="field-sizing-content"
          value={text}
          onChange={(event) => setOwn(event.target.value)}
        />
        <p className="mt-1 text-sm text-ink-2">
          <span className="dial">{characters}</span> characters, {messages === 1 ? "one message" : `${messages} messages`}.
        </p>
      </div>
      <div className="hidden print:block">
        <h2 className="text-base">As a text message</h2>
        <p>{text}</p>
      </div>
      <div className="no-print grid gap-3">
        <TextField
          id="help-number"
          label="To which number?"
          hint="Your mechanic&rsquo;s, or whoever comes. It is kept on this phone for the next time."
          optional
          type="tel"
          autoComplete="off"
          maxLength={40}
          value={number}
          onChange={(event) => change({ number: event.target.value })}
        />
        <div className="grid grid-cols-2 gap-2">
          <LinkButton href={smsLink(number, text)} prefetch={false}>
            Open it in messages
          </LinkButton>
          <Button onClick={() => void copy()}>Copy it</Button>
        </div>
        <p role="status" className="text-sm empty:hidden">
          {copied}
        </p>
      </div>
    </section>
  );
}
