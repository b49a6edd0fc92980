import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";

/** What a passage is asked by; the names are those of the address. */
export const PASSAGE_FIELDS = ["hours", "litres", "months", "dirtyLitres", "clogged", "cloggedLitres"] as const;
export type PassageFields = Partial<Record<(typeof PASSAGE_FIELDS)[number], string>>;

type Props = { path: string; fields: PassageFields; errors: Readonly<Record<string, string | undefined>> };

/** Asks for the passage. A plain form that puts it into the address: it can be linked to, goes back, and needs no script. */
export function PassageForm({ path, fields, errors }: Props) {
  const field = (name: (typeof PASSAGE_FIELDS)[number], label: string, hint?: string) => (
    <TextField
      id={name}
      name={name}
      label={label}
      hint={hint}
      type="number"
      min={0}
      step="any"
      inputMode="decimal"
      required={name === "hours"}
      optional={name !== "hours"}
      defaultValue={fields[name] ?? ""}
      error={errors[name]}
    />
  );
  return (
    <form action={path} method="get" className="no-print grid gap-4">
      <div className="grid grid-cols-1 gap-4 sm:grid-cols-3">
        {field("hours", "Engine hours", "Motoring, all of the passage together")}
        {field("litres", "Litres to burn", "Fuel for those hours")}
        {field("months", "Months away", "Until the next good shop")}
      </div>
      <fieldset className="grid grid-cols-1 gap-4 sm:grid-cols-3">
        <legend className="mb-2 font-semibold">A dirty tank</legend>
        {field("dirtyLitres", "Litres in it now", "Leave empty if the tank is clean")}
        {field("clogged", "Elements clogged so far", "If you have counted")}
        {field("cloggedLitres", "Over how many litres", "Burnt while they clogged")}
      </fieldset>
      <div>
        <Button type="submit">Show what to carry</Button>
      </div>
    </form>
  );
}
