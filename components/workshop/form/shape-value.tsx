import { Choice } from "@/components/ui/choice";
import type { FindingLink } from "@/lib/core/tree/finding-link";
import type { AppliesTo, Cause, Check, Reading } from "@/lib/core/tree/schema";
import { AfterValue, FindingsValue } from "./after-value";
import { AppliesValue } from "./applies-value";
import { BaseValue } from "./base-value";
import { FeaturesValue } from "./features-value";
import { useEditedTree, type Editing } from "./editing";
import { labelOf } from "./field-words";
import { GivesValue } from "./gives-value";
import { GroupValue } from "./group-value";
import { KeyValue } from "./key-value";
import { KeysValue } from "./keys-value";
import { LinksValue } from "./links-value";
import { ListValue } from "./list-value";
import { NumberValue } from "./number-value";
import { OneOfValue } from "./one-of-value";
import { OrderValue } from "./order-value";
import { ReadingValue } from "./reading-value";
import { choicesFor } from "./references";
import type { Shape } from "./shape";
import { TextValue } from "./text-value";

type Props = Editing & { shape: Shape; must: boolean };

/** The editor for a field of a node: its own where the field has one, else the one for its shape. */
export function ShapeValue({ shape, must, ...field }: Props) {
  const tree = useEditedTree();
  const own = ownEditor(field);
  if (own) return own;
  const choices = choicesFor(field.name, tree);
  switch (shape.is) {
    case "text":
      return choices ? (
        <KeyValue {...as<string>(field)} choices={choices} must={must} />
      ) : (
        <TextValue {...as<string>(field)} long={shape.long} />
      );
    case "number":
      return <NumberValue {...as<number>(field)} />;
    case "one-of":
      return <OneOfValue {...as<string>(field)} values={shape.values} must={must} />;
    case "mark":
      return (
        <Choice
          id={field.path}
          checked={field.value === true}
          onChange={(event) => field.onChange(event.target.checked ? true : must ? false : undefined)}
        >
          {labelOf(field.name)}
        </Choice>
      );
    case "group":
      return <GroupValue {...as<object>(field)} fields={shape.fields} must={must} editor={ShapeValue} />;
    case "list":
      if (choices && shape.of.is === "text") return <KeysValue {...as<readonly string[]>(field)} choices={choices} />;
      return <ListValue {...as<readonly unknown[]>(field)} of={shape.of} editor={ShapeValue} />;
    case "map":
      return shape.of.is === "text" ? <FeaturesValue {...as<Readonly<Record<string, string | number>>>(field)} /> : null;
    default:
      return null;
  }
}

/** Fields that are edited in a way of their own, wherever they stand. */
function ownEditor(field: Editing) {
  switch (field.name) {
    case "shows":
    case "curedBy":
    case "broughtOnBy":
      return <LinksValue {...as<Readonly<Record<string, FindingLink>>>(field)} />;
    case "gives":
      return <GivesValue {...as<Cause["gives"]>(field)} />;
    case "base":
      return <BaseValue {...as<Cause["base"]>(field)} />;
    case "appliesTo":
      return <AppliesValue {...as<AppliesTo>(field)} />;
    case "after":
      return <AfterValue {...as<readonly Check["after"][number][]>(field)} />;
    case "firstFor":
      return <OrderValue {...as<Check["firstFor"]>(field)} />;
    case "reading":
      return <ReadingValue {...as<Reading>(field)} />;
    case "clearedBy":
      return <FindingsValue {...as<readonly { check: string; finding: string }[]>(field)} />;
    default:
      return null;
  }
}

/** The schema has said what the field holds. */
const as = <T,>(field: Editing): Editing<T> => field as Editing<T>;
