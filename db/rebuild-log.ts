// Run by `npm run log -- rebuild`: works out every fleet's log anew from the events of its diagnoses. Needs DATABASE_APP_URL
// and DATABASE_IDENTITY_URL.
import { closePools } from "@/db/client";
import { rebuildLogs } from "@/lib/server/log/rebuild-logs";

const { fleets, diagnoses } = await rebuildLogs();
console.log(`the log is rebuilt: ${diagnoses} diagnoses of ${fleets} fleets`);
await closePools();
