import type { FormState } from "@/lib/core/contract/form-state";

/** A server action as a form takes it. */
export type FormAction = (before: FormState, form: FormData) => Promise<FormState>;
