"use client";

import { useSyncExternalStore } from "react";
import type { Observable } from "../observable";

export function useObservable<T>(observable: Observable<T>): T {
  return useSyncExternalStore(observable.watch, observable.get, observable.get);
}
