import { listAgreements } from "@/lib/services/agreements/list-agreements";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listAgreements, "agreements", [
  ["Number", (agreement) => agreement.number],
  ["Name", (agreement) => agreement.name],
  ["Customer", (agreement) => agreement.customer.name],
  ["Tests", (agreement) => agreement.tests],
  ["Sites", (agreement) => agreement.sites],
  ["First day", (agreement) => agreement.startsOn],
  ["Last day", (agreement) => agreement.endsOn],
]);
