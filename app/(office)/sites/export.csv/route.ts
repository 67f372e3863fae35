import { SITE_KIND_WORDS } from "@/lib/domain/sites/words";
import { listSites } from "@/lib/services/sites/list-sites";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listSites, "sites", [
  ["Name", (site) => site.name],
  ["Kind", (site) => SITE_KIND_WORDS[site.kind]],
  ["Street", (site) => site.street],
  ["City", (site) => site.city],
  ["State", (site) => site.state],
  ["Postal code", (site) => site.postalCode],
  ["Time zone", (site) => site.zone],
]);
