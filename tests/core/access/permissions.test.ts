import { describe, expect, test } from "vitest";
import { can, PERMISSIONS, type Permission } from "@/lib/core/access/permissions";
import { ROLES, type Role } from "@/lib/core/access/roles";

// Written out a second time on purpose: a change of the table has to be meant.
const MATRIX: Record<Permission, Record<Role, boolean>> = {
  "fleet:read": { skipper: true, mechanic: true, owner: true },
  "diagnosis:read": { skipper: true, mechanic: true, owner: true },
  "diagnosis:write": { skipper: true, mechanic: true, owner: true },
  "engine:write": { skipper: true, mechanic: true, owner: true },
  "log:read": { skipper: true, mechanic: true, owner: true },
  "log:write": { skipper: true, mechanic: true, owner: true },
  "file:read": { skipper: true, mechanic: true, owner: true },
  "file:write": { skipper: true, mechanic: true, owner: true },
  "tree:read": { skipper: true, mechanic: true, owner: true },
  "tree:write": { skipper: false, mechanic: true, owner: false },
  "boat:write": { skipper: true, mechanic: true, owner: true },
  "boat:remove": { skipper: false, mechanic: false, owner: true },
  "people:read": { skipper: true, mechanic: true, owner: true },
  "people:write": { skipper: false, mechanic: false, owner: true },
  "fleet:write": { skipper: false, mechanic: false, owner: true },
};

describe("who may do what", () => {
  test("every permission is in the matrix", () => {
    expect(Object.keys(PERMISSIONS).sort()).toEqual(Object.keys(MATRIX).sort());
  });

  test.each(Object.entries(MATRIX))("%s", (permission, byRole) => {
    for (const role of ROLES) expect(can([role], permission as Permission), role).toBe(byRole[role]);
  });

  test("roles add up, and without a role nothing may be done", () => {
    for (const permission of Object.keys(PERMISSIONS) as Permission[]) {
      expect(can([], permission)).toBe(false);
      expect(can(ROLES, permission)).toBe(true);
    }
    expect(can(["skipper", "owner"], "tree:write")).toBe(false);
    expect(can(["skipper", "mechanic"], "tree:write")).toBe(true);
  });
});
