import * as z from "zod";
import type { Edit } from "../tree/edits/edit";
import { LIST_KINDS, type ListName } from "../tree/flaw";
import { FaultTree, Key } from "../tree/schema";
import { Id, Moment } from "./id";

const LISTS = Object.keys(LIST_KINDS) as [ListName, ...ListName[]];

/** A node of any kind; what it has to look like is seen when the edited tree is read whole. */
const Node = z.looseObject({ key: Key }).nullable();

/** An edit on its way to a draft. */
export const TreeEdit = z
  .strictObject({
    draft: Id.describe("The draft that it is made in"),
    says: z.string().trim().min(1).max(300),
    changes: z
      .array(
        z.union([
          z.strictObject({ list: z.enum(LISTS), key: Key, before: Node, after: Node, place: z.number().int().nonnegative() }),
          z.strictObject({ head: z.enum(["title", "about", "inseparable"]), before: z.unknown(), after: z.unknown() }),
        ]),
      )
      .min(1)
      .max(20_000),
    /** The shipped version whose content this edit takes up. */
    takesUp: Id.optional(),
  })
  .describe("Changes to nodes, each with what stood before and after");
export type TreeEdit = Edit & { draft: string; takesUp?: string };

export const NewDraft = z.strictObject({ id: Id, versionId: Id.describe("The version to begin from") });
export type NewDraft = z.infer<typeof NewDraft>;

/** Where a draft stands, without its document. */
export const DraftInfo = z.strictObject({
  id: Id,
  /** Counts its saves. */
  version: z.number().int().positive(),
  title: z.string(),
  begunFrom: Id,
  takenUp: Id,
  savedAt: Moment,
  by: z.string(),
});
export type DraftInfo = z.infer<typeof DraftInfo>;

/** The fleet's one draft, whole. */
export const TreeDraft = DraftInfo.extend({ document: FaultTree });
export type TreeDraft = z.infer<typeof TreeDraft>;

export const Publication = z.strictObject({
  draft: Id.describe("The draft that was looked at"),
  note: z.string().trim().min(1).max(1000).describe("What was changed and why, for whoever reads the history"),
  failing: z
    .array(Key)
    .max(10_000)
    .describe("Known cases whose cause is not among the first three, as the workshop's replay of this very draft found"),
  accept: z.array(Key).max(10_000).default([]).describe("Those of them that may fail, each looked at"),
});
export type Publication = z.infer<typeof Publication>;
