import { FilterCan, InjectionPump, Injector, LiftPump, Separator, Tank } from "./fuel-parts";
import { Gauge, Spot } from "./marks";
import { Arrow, Box, Hose, Label, Picture } from "./parts";

export function FuelPath() {
  return (
    <Picture of="fuel-path" height={566}>
      {/* What comes back: thin, on the left. */}
      <path d="M50 520H16V30H34" stroke="var(--fill)" strokeWidth={2} strokeDasharray="6 5" />
      <Tank x={34} y={10} w={100} h={58} />
      <Hose d="M84 52V112" />
      <Label x={150} y={32}>
        {"Tank and\npick-up tube"}
      </Label>
      <Box x={72} y={84} w={24} h={14} of="metal" />
      <path d="M60 91H72" strokeWidth={5} />
      <Label x={150} y={96}>
        Cock
      </Label>
      <Separator x={60} y={116} />
      <Spot x={134} y={138} n={1} />
      <Label x={154} y={134}>
        {"Primary filter,\nseparator"}
      </Label>
      <Hose d="M84 178V236" />
      <Hose d="M84 206H118" width={9} />
      <Gauge x={134} y={206} />
      <Label x={158} y={202}>
        {"Vacuum gauge,\nhere"}
      </Label>
      <LiftPump x={62} y={236} />
      <Label x={154} y={262}>
        Lift pump
      </Label>
      <Hose d="M84 276V312" />
      <FilterCan x={64} y={318} />
      <Spot x={134} y={340} n={2} />
      <Label x={154} y={346}>
        Filter on the engine
      </Label>
      <Hose d="M84 374V440" />
      <Box x={74} y={394} w={20} h={22} />
      <path d="M74 400l20 10M74 410l20 -10" stroke="var(--edge)" strokeWidth={1.5} />
      <Spot x={134} y={405} n={3} />
      <Label x={154} y={401}>
        {"Last filter or\nscreen at the pump"}
      </Label>
      <InjectionPump x={46} y={442} />
      <Label x={154} y={468}>
        Injection pump
      </Label>
      <Hose d="M84 486V500" width={8} />
      <Injector x={74} y={496} />
      <path d="M74 520H50" stroke="var(--fill)" strokeDasharray="6 5" />
      <Label x={154} y={524}>
        Injector
      </Label>
      {["16 310 16 272", "84 72 84 82", "84 182 84 198", "84 214 84 230", "84 284 84 304", "84 424 84 438"].map((along) => (
        <Arrow key={along} along={along} />
      ))}
      <g transform="rotate(90 310 10)">
        <Label x={316} y={10}>
          Sucked: a leak lets air in
        </Label>
        <Label x={586} y={10}>
          Pushed: a leak lets fuel out
        </Label>
      </g>
      <path d="M298 14V254M298 282V540" stroke="var(--edge)" strokeWidth={1.5} />
      <Label x={22} y={214}>
        Return
      </Label>
    </Picture>
  );
}
