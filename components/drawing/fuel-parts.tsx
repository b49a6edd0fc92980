import { Box, Liquid, Part } from "./parts";

type At = { x: number; y: number };

/** Water separator with its bowl: 48 wide, 62 high; fuel in at the left and out at the right, 12 under its top. */
export function Separator({ x, y }: At) {
  return (
    <g>
      <Part d={`M${x + 6} ${y + 24}h36v22l-8 12h-20l-8 -12Z`} of="liquid" />
      <path d={`M${x + 20} ${y + 58}v4h8v-4`} />
      <Box x={x} y={y} w={48} h={24} />
      <path d={`M${x + 10} ${y}v-4h28v4`} />
    </g>
  );
}

/** Filter can on its head: 40 wide, 56 high; in and out 9 under its top; its bleed screw stands on the head. */
export function FilterCan({ x, y }: At) {
  return (
    <g>
      <Part d={`M${x + 5} ${y + 18}h30v32q0 6 -6 6h-18q-6 0 -6 -6Z`} />
      <path d={`M${x + 12} ${y + 26}v22m8 -22v22m8 -22v22`} stroke="var(--edge)" strokeWidth={1.5} />
      <Box x={x} y={y} w={40} h={18} />
      <path d={`M${x + 16} ${y}v-6h8v6`} />
    </g>
  );
}

/** Lift pump with its priming lever: 44 wide, 40 high; pipes at 20 under its top. */
export function LiftPump({ x, y }: At) {
  return (
    <g>
      <path d={`M${x + 22} ${y + 36}l20 14`} strokeWidth={5} />
      <circle cx={x + 22} cy={y + 20} r={20} fill="var(--sheet)" />
      <path d={`M${x + 6} ${y + 20}q8 -8 16 0t16 0`} />
    </g>
  );
}

/** Injection pump: 76 wide, 44 high, with its delivery stubs on top. */
export function InjectionPump({ x, y }: At) {
  return (
    <g>
      <path d={`M${x + 14} ${y}v-7m16 7v-7m16 7v-7m16 7v-7`} strokeWidth={5} />
      <Box x={x} y={y} w={76} h={44} />
      <path d={`M${x} ${y + 30}h76`} stroke="var(--edge)" strokeWidth={1.5} />
    </g>
  );
}

/** Injector with its spray: 20 wide, 60 high. */
export function Injector({ x, y }: At) {
  return (
    <g>
      <path d={`M${x + 10} ${y + 46}l-12 14m12 -14l-3 17m3 -17l3 17m-3 -17l12 14`} stroke="var(--fill)" />
      <Part d={`M${x} ${y}h20v24h-5v16l-5 6l-5 -6v-16h-5Z`} />
    </g>
  );
}

/** Tank cut open: liquid to `level` (a share of its height). */
export function Tank({ x, y, w, h, level = 0.7 }: At & { w: number; h: number; level?: number }) {
  return (
    <g>
      <Box x={x} y={y} w={w} h={h} r={6} />
      <Liquid x={x + 2} y={y + h * (1 - level)} w={w - 4} h={h * level - 2} />
    </g>
  );
}
