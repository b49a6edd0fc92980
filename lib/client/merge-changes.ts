type Tree = { readonly [key: string]: string | Tree };

/**
 * Two changes made to one thing at once, joined field by field: what this person changed stands, everything else is as the
 * other left it. `was`: what both began from.
 */
export function mergeChanges<T extends Tree>(was: T, mine: T, theirs: T): T {
  const keys = new Set([...Object.keys(was), ...Object.keys(mine), ...Object.keys(theirs)]);
  return Object.fromEntries([...keys].map((key) => [key, mergeField(was[key], mine[key], theirs[key])])) as T;
}

type Field = string | Tree | undefined;

function mergeField(was: Field, mine: Field, theirs: Field): Field {
  if (isTree(mine) && isTree(theirs)) return mergeChanges(isTree(was) ? was : {}, mine, theirs);
  return mine === was ? theirs : mine;
}

const isTree = (field: Field): field is Tree => typeof field === "object";
