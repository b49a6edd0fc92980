import type { Role } from "./roles";

/** Who may do what: the one table. An owner may do all that a skipper may; a mechanic may too. */
export const PERMISSIONS = {
  "fleet:read": ["skipper", "mechanic", "owner"],
  "diagnosis:read": ["skipper", "mechanic", "owner"],
  "diagnosis:write": ["skipper", "mechanic", "owner"],
  "engine:write": ["skipper", "mechanic", "owner"],
  "log:read": ["skipper", "mechanic", "owner"],
  "log:write": ["skipper", "mechanic", "owner"],
  "file:read": ["skipper", "mechanic", "owner"],
  "file:write": ["skipper", "mechanic", "owner"],
  "tree:read": ["skipper", "mechanic", "owner"],
  "tree:write": ["mechanic"],
  "boat:write": ["owner", "mechanic", "skipper"],
  "boat:remove": ["owner"],
  "people:read": ["skipper", "mechanic", "owner"],
  "people:write": ["owner"],
  "fleet:write": ["owner"],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

/** May a person with these roles in the fleet do this? */
export function can(roles: readonly Role[], permission: Permission): boolean {
  const allowed: readonly Role[] = PERMISSIONS[permission];
  return roles.some((role) => allowed.includes(role));
}
