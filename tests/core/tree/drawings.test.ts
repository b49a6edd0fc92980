import { readdirSync, readFileSync } from "node:fs";
import { createElement, type ComponentType } from "react";
import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, test } from "vitest";
import { DRAWINGS, isDrawing } from "@/lib/core/tree/drawings";

const FOLDER = "components/drawing";
const sources = new Map(readdirSync(FOLDER).map((file) => [file.replace(".tsx", ""), readFileSync(`${FOLDER}/${file}`, "utf8")]));
const titleCase = (key: string) => key.replace(/(^|-)(.)/g, (_, __, letter: string) => letter.toUpperCase());

async function draw(key: string): Promise<string> {
  const file = (await import(`../../../components/drawing/${key}.tsx`)) as Record<string, ComponentType>;
  const picture = file[titleCase(key)];
  if (picture === undefined) throw new Error(`${key}.tsx exports no ${titleCase(key)}`);
  return renderToStaticMarkup(createElement(picture));
}

test("every file that draws is a known drawing, under its own name", () => {
  const drawn = [...sources].flatMap(([file, text]) => [...text.matchAll(/<Picture of="([^"]*)"/g)].map((match) => [file, match[1]]));
  expect(drawn.map(([file]) => file).sort()).toEqual(Object.keys(DRAWINGS).sort());
  for (const [file, of] of drawn) expect(of).toBe(file);
});

test("a key is known only if it is one of the list's own", () => {
  expect(isDrawing("fuel-path")).toBe(true);
  expect(isDrawing("fuel")).toBe(false);
  expect(isDrawing("constructor")).toBe(false);
});

describe.each(Object.entries(DRAWINGS))("%s", (key, { title, describes }) => {
  test("is told to those who cannot see it", async () => {
    const svg = await draw(key);
    const escaped = (text: string) => text.replaceAll("'", "&#x27;");
    expect(svg).toContain(`>${escaped(title)}</title>`);
    expect(svg).toContain(`>${escaped(describes)}</desc>`);
    expect(svg).toMatch(/role="img" aria-labelledby="[^"]+" aria-describedby="[^"]+"/);
  });

  test("takes every colour from the light that is on", async () => {
    const colours = [...(await draw(key)).matchAll(/ (?:fill|stroke)="([^"]*)"/g)].map((match) => match[1] ?? "");
    expect(colours.filter((colour) => colour !== "none" && !/var\(--/.test(colour))).toEqual([]);
  });

  test("has letters of 14 px and more on a screen 360 px wide", async () => {
    const svg = await draw(key);
    expect(svg).toMatch(/viewBox="0 0 328 \d+"/);
    const sizes = [...svg.matchAll(/font-size="(\d+)"/g)].map((match) => Number(match[1]));
    // The fold's border takes 3 of 328.
    expect(Math.min(...sizes) * (325 / 328)).toBeGreaterThanOrEqual(14);
    expect(svg).not.toMatch(/<text[^>]*transform="[^"]*scale/);
  });
});
