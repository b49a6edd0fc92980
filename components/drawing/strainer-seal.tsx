import { Arrow, Hose, Label, Liquid, Part, Picture, Pointer } from "./parts";

export function StrainerSeal() {
  return (
    <Picture of="strainer-seal" height={292}>
      <Hose d="M0 212H60" width={20} />
      <Hose d="M196 104H240" width={20} />
      <Part d="M52 72V232q0 14 14 14H184q14 0 14 -14V72" />
      <Liquid x={54} y={78} w={142} h={166} />
      <Hose d="M44 212H62" width={20} />
      <Hose d="M190 104H212" width={20} />
      <path d="M80 84V190H168V84" strokeWidth={2.5} />
      <path
        d="M80 100h88m-88 18h88m-88 18h88m-88 18h88m-88 18h88M98 84v106m18 -106v106m18 -106v106m18 -106v106"
        stroke="var(--edge)"
        strokeWidth={1.25}
      />
      <path d="M92 186q8 -14 20 -4t18 -6t24 8" stroke="var(--sound)" strokeWidth={5} />
      <Part d="M40 48H210V64H40Z" of="metal" />
      <path d="M46 69H68M182 69H204" stroke="var(--ink)" strokeWidth={9} strokeLinecap="butt" />
      <path d="M110 48v-12h30v12" fill="var(--sheet)" />
      <Arrow along="4 212 48 212" />
      <Arrow along="204 104 240 104" />
      <Arrow along="262 70 206 70" tone="hurt" width={3} />
      <Label x={248} y={110}>
        To pump
      </Label>
      <Label x={4} y={192}>
        In
      </Label>
      <Label x={266} y={76} tone="hurt">
        Air
      </Label>
      <Label x={220} y={32}>
        {"Seal: clean,\nwet, whole"}
      </Label>
      <Pointer along="216 34 194 68" />
      <Label x={214} y={154}>
        {"Full to the\ntop"}
      </Label>
      <Pointer along="210 150 176 82" />
      <Label x={214} y={216}>
        {"Basket stands\nstraight"}
      </Label>
      <Pointer along="210 212 168 186" />
      <Label x={16} y={276}>
        A bad seal: the pump sucks air
      </Label>
      <Label x={20} y={30}>
        Lid
      </Label>
    </Picture>
  );
}
