import { Button } from "@/components/ui/button";
import { Select } from "@/components/ui/select";
import { Quantity, type Check, type Reading } from "@/lib/core/tree/schema";
import { unitsOf } from "@/lib/core/units/units";
import { AppliesValue } from "./applies-value";
import { BandScale } from "./band-scale";
import { EdgeValue } from "./edge-value";
import { useEdited, type Editing } from "./editing";
import { KeyValue } from "./key-value";
import { NumberValue } from "./number-value";
import { AddRow, Rows } from "./rows";

/** A figure off an instrument: its unit, its scale, and the band of each finding on it. */
export function ReadingValue({ path, value, onChange }: Editing<Reading>) {
  const { tree, node } = useEdited();
  const findings = (node as Partial<Check>).findings ?? [];
  if (value === undefined)
    return (
      <div>
        <Button onClick={() => onChange(begun(findings))}>Read it off an instrument</Button>
      </div>
    );
  const put = (part: Partial<Reading>) => onChange({ ...value, ...part });
  const putBand = (index: number, part: Partial<Reading["bands"][number]>) =>
    put({ bands: value.bands.map((band, other) => (other === index ? { ...band, ...part } : band)) });
  return (
    <fieldset id={path} className="grid gap-3 rounded-lg border border-rule p-3">
      <legend className="font-semibold">Reading</legend>
      <BandScale reading={value} findings={findings} features={tree.features} />
      <div className="grid grid-cols-2 gap-3">
        <Select
          id={`${path}-quantity`}
          label="Quantity"
          value={value.quantity}
          options={Quantity.options.map((one) => ({ value: one, title: one }))}
          onChange={(event) => {
            const quantity = Quantity.parse(event.target.value);
            put({ quantity, unit: unitsOf(quantity)[0]?.symbol ?? "" });
          }}
        />
        <Select
          id={`${path}-unit`}
          label="Unit"
          value={value.unit}
          options={unitsOf(value.quantity).map(({ symbol }) => ({ value: symbol, title: symbol }))}
          onChange={(event) => put({ unit: event.target.value })}
        />
        <NumberValue name="from" path={`${path}-from`} value={value.from} onChange={(from) => from !== undefined && put({ from })} />
        <NumberValue name="to" path={`${path}-to`} value={value.to} onChange={(to) => to !== undefined && put({ to })} />
      </div>
      <Rows
        name="bands"
        path={`${path}-bands`}
        onRemove={(index) => put({ bands: value.bands.filter((_, other) => other !== index) })}
        rows={value.bands.map((band, index) => ({
          key: String(index),
          called: `band ${index + 1}`,
          node: (
            <div className="grid gap-2 rounded-lg border border-rule p-2">
              <KeyValue
                bare
                must
                name="finding"
                path={`${path}-band-${index}`}
                value={band.finding}
                choices={findings}
                onChange={(finding) => finding && putBand(index, { finding })}
              />
              <EdgeValue
                path={`${path}-band-${index}-from`}
                label={`Band ${index + 1} from`}
                value={band.from}
                onChange={(from) => putBand(index, { from })}
              />
              <EdgeValue
                path={`${path}-band-${index}-to`}
                label={`Band ${index + 1} to`}
                value={band.to}
                onChange={(to) => putBand(index, { to })}
              />
              {band.when !== undefined && (
                <AppliesValue
                  name="when"
                  path={`${path}-band-${index}-when`}
                  value={band.when}
                  onChange={(when) => putBand(index, { when })}
                />
              )}
            </div>
          ),
        }))}
        add={
          <AddRow
            says="Add a band"
            onClick={() => put({ bands: [...value.bands, { finding: findings[0]?.key ?? "", from: value.from, to: value.to }] })}
          />
        }
      />
      <div>
        <Button onClick={() => onChange(undefined)}>It is not read off an instrument</Button>
      </div>
    </fieldset>
  );
}

/** A scale cut evenly among the findings, to begin with. */
function begun(findings: Check["findings"]): Reading {
  const step = 100 / Math.max(2, findings.length);
  return {
    quantity: "pressure",
    unit: "kPa",
    from: 0,
    to: 100,
    bands: findings.map(({ key }, index) => ({ finding: key, from: Math.round(index * step), to: Math.round((index + 1) * step) })),
  };
}
