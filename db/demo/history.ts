import type { Who } from "./story";

/** A diagnosis from complaint to proved cure. `at`: engine hours, or days before today for an engine without a meter. */
export type DemoRun = {
  key: string;
  engine: string;
  by: Who;
  at: number;
  symptom: string;
  cause: string;
  complaint: string;
  proved?: false;
  note?: string;
};

/** Blocked primary filters on one engine, sooner each time: 124, 99, 74, 52, 35 and 22 hours. */
export const RUNS: readonly DemoRun[] = [
  {
    key: "filter-3",
    engine: "marrowfat",
    by: "skipper",
    at: 1446,
    symptom: "lost-top-end-rpm",
    cause: "primary-filter-blocked",
    complaint: "wont reach top revs, was fine last month",
  },
  {
    key: "filter-4",
    engine: "marrowfat",
    by: "skipper",
    at: 1520,
    symptom: "lost-top-end-rpm",
    cause: "primary-filter-blocked",
    complaint: "no top end again",
    proved: false,
    note: "Left the berth straight away, no time to try it long.",
  },
  {
    key: "filter-5",
    engine: "marrowfat",
    by: "skipper",
    at: 1572,
    symptom: "lost-top-end-rpm",
    cause: "primary-filter-blocked",
    complaint: "slowly losing revs",
  },
  {
    key: "filter-6",
    engine: "marrowfat",
    by: "owner",
    at: 1607,
    symptom: "lost-top-end-rpm",
    cause: "primary-filter-blocked",
    complaint: "2300 and no more",
  },
  {
    key: "filter-7",
    engine: "marrowfat",
    by: "skipper",
    at: 1629,
    symptom: "lost-top-end-rpm",
    cause: "primary-filter-blocked",
    complaint: "revs gone after an hour, comes back when idling",
    note: "Black slime in the bowl. Third element this season.",
  },
  {
    key: "glow",
    engine: "whistle-port",
    by: "skipper",
    at: 2540,
    symptom: "hard-start-cold",
    cause: "glow-plug-failed",
    complaint: "takes forever to start in the morning",
  },
];

/** Begun yesterday and left after a few answers. */
export const OPEN_RUN: DemoRun & { steps: number } = {
  key: "open",
  engine: "whistle-port",
  by: "skipper",
  at: 2788,
  symptom: "hard-start-cold",
  cause: "glow-supply-fault",
  complaint: "longer every cold morning until it fires",
  steps: 3,
};

/** A repair written in without a diagnosis. */
export type DemoRepair = {
  key: string;
  engine: string;
  by: Who;
  at: number;
  cause?: string;
  causeInWords?: string;
  remedyInWords?: string;
  proof?: string;
  minutes?: number;
  symptom?: string;
  note?: string;
  parts?: readonly string[];
};

export const REPAIRS: readonly DemoRepair[] = [
  {
    key: "filter-1",
    engine: "marrowfat",
    by: "mechanic",
    at: 1223,
    cause: "primary-filter-blocked",
    remedyInWords: "New primary element",
    proof: "Full revs for ten minutes",
    minutes: 35,
    symptom: "lost-top-end-rpm",
    parts: ["Primary filter element"],
  },
  {
    key: "filter-2",
    engine: "marrowfat",
    by: "mechanic",
    at: 1347,
    cause: "primary-filter-blocked",
    remedyInWords: "New primary element, bowl drained",
    proof: "Full revs for ten minutes",
    minutes: 45,
    symptom: "lost-top-end-rpm",
    note: "A cup of dark water and some slime from the bowl.",
    parts: ["Primary filter element"],
  },
  {
    key: "impeller-1",
    engine: "candlewick",
    by: "skipper",
    at: 688,
    causeInWords: "Raw water impeller torn",
    remedyInWords: "New impeller",
    proof: "Strong flow at the exhaust, steady temperature for an hour",
    minutes: 50,
    parts: ["Impeller kit"],
  },
  {
    key: "impeller-2",
    engine: "candlewick",
    by: "skipper",
    at: 781,
    causeInWords: "raw water impeller torn",
    remedyInWords: "New impeller",
    minutes: 40,
    parts: ["Impeller kit"],
  },
  {
    key: "impeller-3",
    engine: "candlewick",
    by: "mechanic",
    at: 869,
    causeInWords: "Raw-water impeller  torn.",
    remedyInWords: "New impeller, all vanes found and taken out of the heat exchanger",
    proof: "Flow measured: 11 litres in a minute at 1500",
    minutes: 95,
    note: "Score in the pump's cover. It should be changed.",
    parts: ["Impeller kit"],
  },
  {
    key: "impeller-4",
    engine: "candlewick",
    by: "skipper",
    at: 1021,
    causeInWords: "Raw water impeller torn",
    remedyInWords: "New impeller",
    proof: "An hour at cruising revs, temperature steady",
    minutes: 35,
    note: "Cover still scored.",
    parts: ["Impeller kit"],
  },
  {
    key: "belt",
    engine: "candlewick",
    by: "owner",
    at: 930,
    causeInWords: "Alternator belt slipping",
    remedyInWords: "Belt tightened",
    proof: "No squeal at full load",
    minutes: 20,
  },
  {
    key: "hull",
    engine: "whistle-port",
    by: "mechanic",
    at: 2410,
    cause: "hull-fouled",
    remedyInWords: "Lifted and scrubbed",
    proof: "Full revs on the measured mile",
    minutes: 300,
    symptom: "lost-top-end-rpm",
  },
  {
    key: "supper-vent",
    engine: "supper",
    by: "owner",
    at: 210,
    cause: "tank-vent-blocked",
    remedyInWords: "Vent hose cleared of a wasps' nest",
    proof: "Two hours without a falter",
    minutes: 30,
    symptom: "lost-top-end-rpm",
  },
];
