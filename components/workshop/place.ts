"use client";

import { usePathname, useSearchParams } from "next/navigation";
import { useCallback, useMemo } from "react";
import { isListName, type ListName } from "@/lib/core/tree/flaw";

export const VIEWS = ["graph", "table", "try", "prove", "learn"] as const;
export type View = (typeof VIEWS)[number];

/** Where in the workshop one is: in the address, so that back, reload and a link to a colleague work. */
export type Place = { view: View; symptom: string | null; node: { list: ListName; key: string } | null };

export function usePlace(): [Place, (to: Partial<Place>) => void] {
  const search = useSearchParams();
  const path = usePathname();
  const place = useMemo(() => readPlace(search), [search]);
  // Not the router's push: nothing on the server changes, and nothing has to be fetched.
  const go = useCallback(
    (to: Partial<Place>) => {
      const query = writePlace({ ...readPlace(new URLSearchParams(window.location.search)), ...to });
      window.history.pushState(null, "", query === "" ? path : `${path}?${query}`);
    },
    [path],
  );
  return [place, go];
}

export function readPlace(search: { get(name: string): string | null }): Place {
  const [list = "", key = ""] = (search.get("node") ?? "").split(":");
  return {
    view: VIEWS.find((view) => view === search.get("view")) ?? "graph",
    symptom: search.get("symptom"),
    node: isListName(list) && key !== "" ? { list, key } : null,
  };
}

export function writePlace({ view, symptom, node }: Place): string {
  const query = new URLSearchParams();
  if (view !== "graph") query.set("view", view);
  if (symptom) query.set("symptom", symptom);
  if (node) query.set("node", `${node.list}:${node.key}`);
  return query.toString();
}
