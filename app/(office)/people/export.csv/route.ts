import { ROLE_WORDS } from "@/lib/domain/shared/roles";
import { listPeople } from "@/lib/services/people/list-people";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listPeople, "people", [
  ["Name", (person) => person.name],
  ["Role", (person) => ROLE_WORDS[person.role]],
  ["Telephone", (person) => person.phone],
  ["E-mail address", (person) => person.email],
  [
    "Licenses",
    ({ licenses }) => licenses.map((one) => `${one.jurisdiction} ${one.number} until ${one.expiresOn}`).join("; "),
  ],
]);
