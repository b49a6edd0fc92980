// Run by the start command, after the shipped tree is loaded: the demo fleet, once. Needs DATABASE_APP_URL and
// DATABASE_IDENTITY_URL; DEMO_TODAY (YYYY-MM-DD) sets the day the story ends on; DEMO_REPORT names a file for the sign-ins.
import { writeFileSync } from "node:fs";
import { closePools } from "@/db/client";
import { loadDemo } from "@/db/demo/load-demo";

const { isNew, ...demo } = await loadDemo(new Date(process.env.DEMO_TODAY ?? Date.now()));
if (process.env.DEMO_REPORT) writeFileSync(process.env.DEMO_REPORT, JSON.stringify(demo), { mode: 0o600 });
if (isNew) console.log("the demo fleet is loaded");
await closePools();
