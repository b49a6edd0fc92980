"use client";

import { useEffect, useRef, type ComponentProps } from "react";

/**
 * A form that says itself what is wrong: the browser's bubbles stay away, and once it has been given in with
 * something wrong the first such field comes to whoever gave it in, however long the form is.
 */
export function Form({ onSubmit, onInput, ...rest }: Omit<ComponentProps<"form">, "noValidate">) {
  const form = useRef<HTMLFormElement>(null);
  const givenIn = useRef(false);
  // Errors come with a later render; some only with the server's answer.
  useEffect(() => {
    if (!givenIn.current) return;
    const first = form.current?.querySelector<HTMLElement>('[aria-invalid="true"]');
    if (!first) return;
    givenIn.current = false;
    first.focus({ preventScroll: true });
    first.scrollIntoView({ block: "center" });
  });
  return (
    <form
      ref={form}
      noValidate
      onSubmit={(event) => {
        givenIn.current = true;
        onSubmit?.(event);
      }}
      onInput={(event) => {
        givenIn.current = false;
        onInput?.(event);
      }}
      {...rest}
    />
  );
}
