"use client";

import { useState } from "react";
import type { HandOverFacts } from "@/lib/client/hand-over/facts";
import { handOverMessage, messageLength } from "@/lib/client/hand-over/message";
import { Button } from "@/components/ui/button";
import { LinkButton } from "@/components/ui/link-button";
import { TextArea } from "@/components/ui/text-area";

/** The same as a text message, which gets through where nothing else does. It can be altered before it is sent. */
export function HandOverMessage({ facts }: { facts: HandOverFacts }) {
  const [own, setOwn] = useState<string | null>(null);
  const [copied, setCopied] = useState("");
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
    <section aria-label="As a text message" className="grid gap-2">
      <TextArea id="message" label="As a text message" rows={8} value={text} onChange={(event) => setOwn(event.target.value)} />
      <p className="text-sm text-ink-2">
        <span className="dial">{characters}</span> characters, {messages === 1 ? "one message" : `${messages} messages`}.
      </p>
      <div className="grid grid-cols-2 gap-2">
        <LinkButton href={`sms:?&body=${encodeURIComponent(text)}`} prefetch={false}>
          Open it in messages
        </LinkButton>
        <Button onClick={() => void copy()}>Copy it</Button>
      </div>
      <p role="status" className="text-sm">
        {copied}
      </p>
    </section>
  );
}
