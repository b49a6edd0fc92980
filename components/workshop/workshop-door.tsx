"use client";

import dynamic from "next/dynamic";

/** The workshop is large and works on what this device keeps: it comes after the page, and only to a browser. */
export const WorkshopDoor = dynamic(() => import("./workshop").then((module) => module.Workshop), {
  ssr: false,
  loading: () => (
    <p role="status" className="py-8">
      Opening the workshop…
    </p>
  ),
});
