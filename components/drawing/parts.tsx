import { useId, type ReactNode } from "react";
import { DRAWINGS, type DrawingKey } from "@/lib/core/tree/drawings";

type Point = readonly [number, number];
type Tone = "ink" | "flow" | "hurt" | "right";

/** Metal, and gas in a pipe: a grey of the paper, dark enough in night light for letters on it. */
export const METAL = "color-mix(in srgb, var(--rule) 55%, var(--sheet))";

const COLOUR: Record<Tone, string> = { ink: "var(--ink)", flow: "var(--fill)", hurt: "var(--lead)", right: "var(--sound)" };

/**
 * The sheet that a drawing stands on, with its title and words for a screen
 * reader. All are 328 wide, a 360 px screen between its margins, so that 16 is
 * 16 px there.
 */
export function Picture({ of, height, children }: { of: DrawingKey; height: number; children: ReactNode }) {
  const id = useId();
  const { title, describes } = DRAWINGS[of];
  return (
    <svg
      viewBox={`0 0 328 ${height}`}
      className="block h-auto w-full"
      role="img"
      aria-labelledby={`${id}title`}
      aria-describedby={`${id}says`}
      focusable="false"
    >
      <title id={`${id}title`}>{title}</title>
      <desc id={`${id}says`}>{describes}</desc>
      <g fill="none" stroke="var(--ink)" strokeWidth={2} strokeLinecap="round" strokeLinejoin="round" fontSize={16}>
        {children}
      </g>
    </svg>
  );
}

type LabelProps = { x: number; y: number; children: string; at?: "start" | "middle" | "end"; tone?: Tone; bold?: boolean };

/** Words on a drawing, a line each "\n"; y is the first line's. The paper round the letters keeps lines off them. */
export function Label({ x, y, children, at = "start", tone = "ink", bold = false }: LabelProps) {
  // The flow's own colour is too dark for letters in night light.
  const fill = tone === "flow" ? "var(--ink)" : COLOUR[tone];
  return (
    <text
      x={x}
      y={y}
      textAnchor={at}
      fill={fill}
      fontWeight={bold ? 700 : 400}
      stroke="var(--sheet)"
      strokeWidth={4}
      style={{ paintOrder: "stroke" }}
    >
      {children.split("\n").map((line, index) => (
        <tspan key={line} x={x} dy={index === 0 ? 0 : 19}>
          {line}
        </tspan>
      ))}
    </text>
  );
}

/** A solid thing: ink outline on paper. `of` fills it with liquid, or fills it with metal's grey. */
export function Part({ d, of = "paper" }: { d: string; of?: "paper" | "liquid" | "metal" }) {
  return <path d={d} fill={{ paper: "var(--sheet)", liquid: "var(--shoal)", metal: METAL }[of]} />;
}

export function Box({
  x,
  y,
  w,
  h,
  r = 4,
  of = "paper",
}: {
  x: number;
  y: number;
  w: number;
  h: number;
  r?: number;
  of?: "paper" | "metal";
}) {
  return <rect x={x} y={y} width={w} height={h} rx={r} fill={of === "metal" ? METAL : "var(--sheet)"} />;
}

/** Liquid standing in something, with its surface. */
export function Liquid({ x, y, w, h }: { x: number; y: number; w: number; h: number }) {
  const waves = Math.max(1, Math.round(w / 24));
  const half = w / waves / 2;
  const surface = `M${x} ${y}${`q${half / 2} -4 ${half} 0t${half} 0`.repeat(waves)}`;
  return (
    <g stroke="none">
      <path d={`${surface}V${y + h}H${x}Z`} fill="var(--shoal)" />
      <path d={surface} stroke="var(--fill)" />
    </g>
  );
}

/** A hose or pipe with walls; what it carries is pale inside. */
export function Hose({ d, of = "liquid", width = 12 }: { d: string; of?: "liquid" | "gas" | "empty"; width?: number }) {
  const inside = { liquid: "var(--shoal)", gas: METAL, empty: "var(--sheet)" }[of];
  return (
    <g strokeLinecap="butt">
      <path d={d} strokeWidth={width} />
      <path d={d} stroke={inside} strokeWidth={width - 4} />
    </g>
  );
}

/** "10 20 10 40" as points. */
const points = (along: string): Point[] => {
  const numbers = along.split(" ").map(Number);
  return numbers.flatMap((x, index) => (index % 2 === 0 ? [[x, numbers[index + 1] ?? 0] as const] : []));
};

/** An arrow along straight lines through points "x y x y ..."; its head is at the last. */
export function Arrow({ along, tone = "flow", width = 2.5 }: { along: string; tone?: Tone; width?: number }) {
  const [before = [0, 0], tip = [0, 0]] = points(along).slice(-2);
  const angle = Math.atan2(tip[1] - before[1], tip[0] - before[0]);
  const back = (turn: number) => `${(tip[0] - 9 * Math.cos(angle + turn)).toFixed(1)} ${(tip[1] - 9 * Math.sin(angle + turn)).toFixed(1)}`;
  return (
    <g stroke={COLOUR[tone]} strokeWidth={width}>
      <path d={`M${along}`} />
      <path d={`M${back(0.5)}L${tip.join(" ")}L${back(-0.5)}`} />
    </g>
  );
}

/** A thin line from words to the thing they mean, "x y x y", with a dot on the thing. */
export function Pointer({ along }: { along: string }) {
  const [x, y] = points(along).at(-1) ?? [0, 0];
  return (
    <g stroke="var(--ink-2)" strokeWidth={1.25}>
      <path d={`M${along}`} />
      <circle cx={x} cy={y} r={2.5} fill="var(--ink-2)" />
    </g>
  );
}

/** A meter's lead through points "x y x y ...", brass on ink, its probe at the last. */
export function Probe({ along }: { along: string }) {
  const [x, y] = points(along).at(-1) ?? [0, 0];
  return (
    <g>
      <path d={`M${along}`} strokeWidth={5} />
      <path d={`M${along}`} strokeWidth={2.5} stroke="var(--brass)" />
      <circle cx={x} cy={y} r={5} fill="var(--brass)" />
    </g>
  );
}
