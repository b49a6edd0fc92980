import type { TreeNode } from "@/lib/core/tree/edits/edit";
import { nameOf, findNode, listOf } from "@/lib/core/tree/edits/edit";
import { usersOf } from "@/lib/core/tree/edits/remove-node";
import type { ListName, NodeKind } from "@/lib/core/tree/flaw";
import type { FaultTree } from "@/lib/core/tree/schema";
import { Fold } from "@/components/ui/fold";
import type { Place } from "./place";

type Props = { tree: FaultTree; list: ListName; node: TreeNode; onOpen: (node: Place["node"]) => void };

/** The nodes that lead here: how one walks the links without the picture. */
export function NodeLinks({ tree, list, node, onOpen }: Props) {
  const users = usersOf(tree, list, node.key).flatMap(({ kind, key }) => {
    const of = listOf(kind as NodeKind);
    const user = of === null ? null : findNode(tree, of, key);
    return of === null || user === null ? [] : [{ kind, list: of, key, name: nameOf(user) }];
  });
  if (users.length === 0) return null;
  return (
    <Fold className="mb-4" title={users.length === 1 ? "One node leads here" : `${users.length} nodes lead here`}>
      <ul className="max-h-64 overflow-y-auto">
        {users.map((user) => (
          <li key={`${user.list}:${user.key}`}>
            <button type="button" className="link min-h-12 text-left" onClick={() => onOpen({ list: user.list, key: user.key })}>
              {user.name}
            </button>{" "}
            <span className="text-sm text-ink-2">{user.kind}</span>
          </li>
        ))}
      </ul>
    </Fold>
  );
}
