import type { Routes } from "@/lib/server/web/openapi";
import * as passage from "./fleets/[fleetId]/boats/[boatId]/passage/route";
import * as boat from "./fleets/[fleetId]/boats/[boatId]/route";
import * as boats from "./fleets/[fleetId]/boats/route";
import * as events from "./fleets/[fleetId]/diagnoses/[diagnosisId]/events/route";
import * as diagnosis from "./fleets/[fleetId]/diagnoses/[diagnosisId]/route";
import * as story from "./fleets/[fleetId]/diagnoses/[diagnosisId]/story/route";
import * as diagnoses from "./fleets/[fleetId]/diagnoses/route";
import * as reading from "./fleets/[fleetId]/engines/[engineId]/hours/[readingId]/route";
import * as hours from "./fleets/[fleetId]/engines/[engineId]/hours/route";
import * as engineLog from "./fleets/[fleetId]/engines/[engineId]/log/route";
import * as repair from "./fleets/[fleetId]/engines/[engineId]/repairs/[repairId]/route";
import * as repairs from "./fleets/[fleetId]/engines/[engineId]/repairs/route";
import * as engineEvidence from "./fleets/[fleetId]/engines/[engineId]/evidence/route";
import * as engineRepeats from "./fleets/[fleetId]/engines/[engineId]/repeats/route";
import * as engine from "./fleets/[fleetId]/engines/[engineId]/route";
import * as engines from "./fleets/[fleetId]/engines/route";
import * as file from "./fleets/[fleetId]/files/[fileId]/route";
import * as invitation from "./fleets/[fleetId]/invitations/[invitationId]/route";
import * as invitations from "./fleets/[fleetId]/invitations/route";
import * as log from "./fleets/[fleetId]/log/route";
import * as person from "./fleets/[fleetId]/people/[userId]/route";
import * as people from "./fleets/[fleetId]/people/route";
import * as phone from "./fleets/[fleetId]/phone/route";
import * as repeats from "./fleets/[fleetId]/repeats/route";
import * as fleet from "./fleets/[fleetId]/route";
import * as trees from "./fleets/[fleetId]/trees/route";
import * as treeDraft from "./fleets/[fleetId]/trees/draft/route";
import * as publication from "./fleets/[fleetId]/trees/draft/publication/route";
import * as treeDraftFile from "./fleets/[fleetId]/trees/draft/file/route";
import * as loggedCases from "./fleets/[fleetId]/trees/logged-cases/route";
import * as treeReading from "./fleets/[fleetId]/trees/reading/route";
import * as treeVersionFile from "./fleets/[fleetId]/trees/versions/[versionId]/file/route";
import * as treeVersion from "./fleets/[fleetId]/trees/versions/[versionId]/route";
import * as me from "./me/route";

/** Every address under /api/v1 but the description itself; a test holds it against the folders. */
export const routes: Routes = {
  "/me": me,
  "/fleets/{fleetId}": fleet,
  "/fleets/{fleetId}/boats": boats,
  "/fleets/{fleetId}/boats/{boatId}": boat,
  "/fleets/{fleetId}/boats/{boatId}/passage": passage,
  "/fleets/{fleetId}/engines": engines,
  "/fleets/{fleetId}/engines/{engineId}": engine,
  "/fleets/{fleetId}/engines/{engineId}/hours": hours,
  "/fleets/{fleetId}/engines/{engineId}/hours/{readingId}": reading,
  "/fleets/{fleetId}/engines/{engineId}/repairs": repairs,
  "/fleets/{fleetId}/engines/{engineId}/repairs/{repairId}": repair,
  "/fleets/{fleetId}/engines/{engineId}/log": engineLog,
  "/fleets/{fleetId}/engines/{engineId}/evidence": engineEvidence,
  "/fleets/{fleetId}/engines/{engineId}/repeats": engineRepeats,
  "/fleets/{fleetId}/log": log,
  "/fleets/{fleetId}/repeats": repeats,
  "/fleets/{fleetId}/diagnoses": diagnoses,
  "/fleets/{fleetId}/diagnoses/{diagnosisId}": diagnosis,
  "/fleets/{fleetId}/diagnoses/{diagnosisId}/events": events,
  "/fleets/{fleetId}/diagnoses/{diagnosisId}/story": story,
  "/fleets/{fleetId}/files/{fileId}": file,
  "/fleets/{fleetId}/trees": trees,
  "/fleets/{fleetId}/trees/draft": treeDraft,
  "/fleets/{fleetId}/trees/draft/file": treeDraftFile,
  "/fleets/{fleetId}/trees/draft/publication": publication,
  "/fleets/{fleetId}/trees/logged-cases": loggedCases,
  "/fleets/{fleetId}/trees/reading": treeReading,
  "/fleets/{fleetId}/trees/versions/{versionId}": treeVersion,
  "/fleets/{fleetId}/trees/versions/{versionId}/file": treeVersionFile,
  "/fleets/{fleetId}/phone": phone,
  "/fleets/{fleetId}/people": people,
  "/fleets/{fleetId}/people/{userId}": person,
  "/fleets/{fleetId}/invitations": invitations,
  "/fleets/{fleetId}/invitations/{invitationId}": invitation,
};
