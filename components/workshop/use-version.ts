"use client";

import { useEffect, useState } from "react";
import { request } from "@/lib/client/exchange/request";
import { TreeVersionDocument } from "@/lib/core/contract/tree";
import type { FaultTree } from "@/lib/core/tree/schema";

/** The document of a published version; null while it is fetched. */
export function useVersion(fleetId: string, versionId: string): FaultTree | null {
  const [document, setDocument] = useState<FaultTree | null>(null);
  useEffect(() => {
    let current = true;
    request(`/api/v1/fleets/${fleetId}/trees/versions/${versionId}`)
      .then((answer) => current && setDocument(TreeVersionDocument.parse(answer).document))
      .catch((failure: unknown) => console.error(failure));
    return () => {
      current = false;
    };
  }, [fleetId, versionId]);
  return document;
}
