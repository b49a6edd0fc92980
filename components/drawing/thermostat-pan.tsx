import { Liquid, Label, Part, Picture, Pointer } from "./parts";

export function ThermostatPan() {
  return (
    <Picture of="thermostat-pan" height={284}>
      <Part d="M30 90V196q0 12 12 12H214q12 0 12 -12V90" />
      <Liquid x={32} y={108} w={192} h={98} />
      <path d="M226 104h44" strokeWidth={6} />
      <path d="M60 226q8 -8 0 -14M100 226q8 -8 0 -14M140 226q8 -8 0 -14M180 226q8 -8 0 -14" stroke="var(--lead)" strokeWidth={3} />
      <path d="M90 14V134" strokeWidth={1.5} />
      <Part d="M60 156h60l-8 10h-44Z" of="metal" />
      <Part d="M76 134h28v10h-28Z" of="metal" />
      <path d="M84 144v12m12 -12v12" />
      <Part d="M80 166h20v18q0 6 -10 6t-10 -6Z" of="metal" />
      <Part d="M172 34q0 -8 8 -8t8 8V156q8 6 4 16q-4 8 -12 8t-12 -8q-4 -10 4 -16Z" />
      <path d="M180 76V164" stroke="var(--lead)" strokeWidth={4} />
      <path d="M188 60h-5m5 16h-5m5 16h-5" strokeWidth={1.5} />
      <Label x={200} y={44}>
        Thermometer
      </Label>
      <Label x={100} y={32}>
        String
      </Label>
      <Label x={12} y={72}>
        Opens
      </Label>
      <Pointer along="40 78 82 149" />
      <Label x={14} y={252}>
        {"Begins at its stamp; wide open\n10 to 12 °C above"}
      </Label>
      <Label x={236} y={140}>
        {"Neither\ntouches\nthe pan"}
      </Label>
    </Picture>
  );
}
