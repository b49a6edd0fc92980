import { describe, expect, test } from "vitest";
import { mergeChanges } from "@/lib/client/merge-changes";

const was = { name: "Main engine", cylinders: "", features: { turbo: "", cooling: "keel" } };

describe("two changes to one thing at once", () => {
  test("are both kept where they do not touch each other", () => {
    const mine = { ...was, cylinders: "4" };
    const theirs = { ...was, features: { turbo: "none", cooling: "keel" } };
    expect(mergeChanges(was, mine, theirs)).toEqual({ name: "Main engine", cylinders: "4", features: { turbo: "none", cooling: "keel" } });
  });
  test("end with mine where both changed one field", () => {
    const mine = { ...was, name: "Port" };
    const theirs = { ...was, name: "Starboard" };
    expect(mergeChanges(was, mine, theirs).name).toBe("Port");
  });
  test("keep a field that I emptied empty", () => {
    const mine = { ...was, features: { turbo: "", cooling: "" } };
    const theirs = { ...was, features: { turbo: "turbo", cooling: "keel" } };
    expect(mergeChanges(was, mine, theirs).features).toEqual({ turbo: "turbo", cooling: "" });
  });
  test("keep a field that only theirs has", () => {
    const theirs = { ...was, features: { ...was.features, voltage: "v24" } };
    expect(mergeChanges<typeof was>(was, was, theirs).features).toEqual(theirs.features);
  });
});
