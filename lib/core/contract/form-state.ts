/** What a form's action says back; the first argument and the result of `useActionState`. */
export type FormState =
  | { status: "untouched" }
  | { status: "done"; says: string }
  /** `fields`: by the field's name, what is wrong with it. `says`: what concerns the whole form. `until`: when to try again. */
  | { status: "refused"; says: string; fields: Readonly<Record<string, string>>; until?: string };

export const untouched: FormState = { status: "untouched" };
