type Places = Readonly<Record<string, { x: number; y: number }>>;

const nameOf = (draftId: string, symptom: string): string => `gudgeon.places.${draftId}.${symptom}`;

/** Where a hand has put nodes of a symptom's part; all others settle by themselves. Kept on this device only. */
export function handPlaces(draftId: string, symptom: string): Places {
  try {
    return (JSON.parse(localStorage.getItem(nameOf(draftId, symptom)) ?? "{}") ?? {}) as Places;
  } catch {
    return {};
  }
}

export function keepHandPlaces(draftId: string, symptom: string, places: Places): void {
  try {
    localStorage.setItem(nameOf(draftId, symptom), JSON.stringify(places));
  } catch {
    // What is moved then settles anew with the next reload.
  }
}
