import "server-only";
import { headers } from "next/headers";
import { redirect, unstable_rethrow } from "next/navigation";
import type * as z from "zod";
import type { Permission } from "@/lib/core/access/permissions";
import type { FormState } from "@/lib/core/contract/form-state";
import type { Id } from "@/lib/core/contract/id";
import { Problem } from "@/lib/core/contract/problem";
import { clientAddress } from "../auth/client-address";
import type { Person } from "../auth/person";
import { prove, type FleetScope } from "../auth/scope";
import { problemOf } from "./failure";
import { formValues } from "./form-values";
import { pagePerson } from "./page-scope";
import { parse } from "./parse";

export type FormAction = (state: FormState, form: FormData) => Promise<FormState>;
/** What a form's work ends with: something to say, or a page of this site to go to. */
export type Outcome = FormState | { goTo: string };

export const done = (says: string): Outcome => ({ status: "done", says });
export const refused = (says: string, fields: Record<string, string> = {}): Outcome => ({ status: "refused", says, fields });
/** "Too many tries. Try again in 12 minutes." */
export const wait = (until: string | Date, instead = ""): Outcome => {
  const minutes = Math.max(1, Math.ceil((new Date(until).getTime() - Date.now()) / 60_000));
  const says = `Too many tries. Try again in ${minutes === 1 ? "a minute" : `${minutes} minutes`}.${instead && ` ${instead}`}`;
  return { status: "refused", says, fields: {}, until: new Date(until).toISOString() };
};

/** Parse, run, translate. Next compares Origin and Host of every action before it gets here. */
function form<S extends z.ZodType>(shape: S, work: (input: z.output<S>) => Promise<Outcome>): FormAction {
  return async (_state, given) => {
    const outcome = await translated(() => work(parse(shape, formValues(given))));
    if ("goTo" in outcome) redirect(outcome.goTo);
    return outcome;
  };
}

async function translated(work: () => Promise<Outcome>): Promise<Outcome> {
  try {
    return await work();
  } catch (error) {
    unstable_rethrow(error);
    const { detail, extras } = problemOf(error);
    if (typeof extras.until === "string") return wait(extras.until);
    const errors = Array.isArray(extras.errors) ? (extras.errors as { path: string; says: string }[]) : [];
    if (errors.length === 0) return refused(detail);
    return refused("Look at what is marked.", Object.fromEntries(errors.map((e) => [e.path.split(".")[0] ?? "", e.says])));
  }
}

/** A form for everyone: sign-in, sign-up, links from mails. `place` is where it comes from, for counting tries. */
export const publicAction = <S extends z.ZodType>(spec: {
  input: S;
  run(input: z.output<S>, place: string): Promise<Outcome>;
}): FormAction => form(spec.input, async (input) => spec.run(input, clientAddress(await headers())));

/** A form about one's own account. */
export const personalAction = <S extends z.ZodType>(spec: {
  input: S;
  run(person: Person, input: z.output<S>): Promise<Outcome>;
}): FormAction =>
  form(spec.input, async (input) => {
    const person = await pagePerson();
    if (!person) throw Problem.signedOut();
    return spec.run(person, input);
  });

/** A form within a fleet, proved like a route. */
export const fleetAction = <P extends Permission, S extends z.ZodObject<{ fleetId: typeof Id }>>(spec: {
  permission: P;
  input: S;
  run(scope: FleetScope<P>, input: z.output<S>): Promise<Outcome>;
}): FormAction =>
  form(spec.input, async (input) => {
    const person = await pagePerson();
    if (!person) throw Problem.signedOut();
    const pass = await prove(person, (input as { fleetId: string }).fleetId, spec.permission);
    return pass.enter((scope) => spec.run(scope, input));
  });
