import { FilterCan, InjectionPump, Injector, LiftPump, Separator, Tank } from "./fuel-parts";
import { Spot } from "./marks";
import { Arrow, Box, Hose, Label, Part, Picture } from "./parts";

export function BleedingOrder() {
  return (
    <Picture of="bleeding-order" height={352}>
      <Hose d="M54 76H142" />
      <Hose d="M184 76H248" />
      <Hose d="M282 86V166H20V220H44" />
      <Hose d="M84 220H142" />
      <Hose d="M206 204V188H284V196" width={8} />
      <Tank x={10} y={36} w={58} h={52} />
      <path d="M88 62v-14m-10 0h20" strokeWidth={4} />
      <Box x={80} y={66} w={16} h={20} of="metal" />
      <Separator x={138} y={64} />
      <LiftPump x={254} y={56} />
      <path d="M296 106q12 -6 10 -20" stroke="var(--fill)" strokeWidth={2.5} />
      <FilterCan x={44} y={211} />
      <InjectionPump x={142} y={204} />
      <Injector x={274} y={194} />
      <Part d="M180 204v-8h8v8" />
      <Spot x={162} y={44} n={1} />
      <Spot x={276} y={40} n={2} />
      <Spot x={64} y={190} n={3} />
      <Spot x={184} y={184} n={4} />
      <Spot x={308} y={200} n={5} />
      <Label x={46} y={112} at="middle">
        {"Tank cock\nopen"}
      </Label>
      <Label x={162} y={146} at="middle">
        Primary, top
      </Label>
      <Label x={268} y={128} at="end">
        Lift pump
      </Label>
      <Label x={64} y={286} at="middle">
        {"Filter on\nthe engine"}
      </Label>
      <Label x={180} y={268} at="middle">
        {"Injection\npump"}
      </Label>
      <Label x={280} y={286} at="middle" tone="hurt">
        {"Injectors:\nmechanic"}
      </Label>
      <Arrow along="104 76 128 76" />
      <Arrow along="200 76 236 76" />
      <Arrow along="190 166 130 166" />
      <Arrow along="100 220 130 220" />
      <Label x={164} y={334} at="middle" tone="hurt">
        Common rail, unit injectors: stop after 3
      </Label>
    </Picture>
  );
}
