import { DUE_STATE_WORDS } from "@/lib/domain/agreements/due-words";
import { FREQUENCY_WORDS, TEST_KIND_WORDS } from "@/lib/domain/agreements/words";
import { listDue } from "@/lib/services/jobs/list-due";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listDue, "due-list", [
  ["Test", (row) => TEST_KIND_WORDS[row.item.testKind]],
  ["How often", (row) => FREQUENCY_WORDS[row.item.frequency]],
  ["Site", (row) => row.site.name],
  ["City", (row) => row.site.city],
  ["State", (row) => row.site.state],
  ["Customer", (row) => row.customer.name],
  ["Agreement", (row) => row.agreement.number],
  ["Earliest", (row) => row.window.earliest],
  ["Target", (row) => row.window.target],
  ["Latest", (row) => row.window.latest],
  ["When", (row) => DUE_STATE_WORDS[row.state]],
  ["Days left", (row) => row.daysLeft],
  ["In the way", (row) => row.obstacles.map((obstacle) => obstacle.words).join("; ")],
  ["Job", (row) => row.job?.number],
  ["How it was reckoned", (row) => row.reckoning],
]);
