"use client";

import { useEffect, useRef, type ReactNode } from "react";

/** The heading of a screen. It takes the focus when the screen changes, so that a screen reader says where one is. */
export function ScreenHeading({
  children,
  of,
}: {
  children: ReactNode;
  /** What the screen is about; a change of it is a new screen. */ of: string;
}) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    window.scrollTo({ top: 0 });
    heading.current?.focus({ preventScroll: true });
  }, [of]);
  return (
    <h1 ref={heading} tabIndex={-1}>
      {children}
    </h1>
  );
}
