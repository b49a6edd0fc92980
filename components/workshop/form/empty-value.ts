import type { Shape } from "./shape";

/** What a row that was just added holds: nothing yet, in the shape it has to get. */
export function emptyOf(shape: Shape): unknown {
  switch (shape.is) {
    case "text":
      return "";
    case "group":
      return Object.fromEntries(shape.fields.filter(({ must }) => must).map((field) => [field.name, emptyOf(field.shape)]));
    case "list":
      return [];
    case "map":
      return {};
    case "one-of":
      return shape.values[0];
    default:
      return undefined;
  }
}
