import { Choice } from "@/components/ui/choice";
import { ROLES, type Role } from "@/lib/core/access/roles";

const WHAT: Readonly<Record<Role, string>> = {
  skipper: "diagnoses faults and writes the log",
  mechanic: "the same, and keeps the fault tree",
  owner: "the same as a skipper, and manages boats and people",
};

/** Which roles a person has: several at once, on most boats all three. */
export function RoleBoxes({ legend, roles, error }: { legend: string; roles: readonly Role[]; error?: string | undefined }) {
  return (
    <fieldset>
      <legend className="font-semibold">{legend}</legend>
      {ROLES.map((role) => (
        <Choice key={role} name="roles" value={role} defaultChecked={roles.includes(role)}>
          <b className="font-semibold">{role}</b>: {WHAT[role]}
        </Choice>
      ))}
      {error && (
        <p role="alert" className="text-sm font-semibold text-lead">
          {error}
        </p>
      )}
    </fieldset>
  );
}
