import { listCustomers } from "@/lib/services/customers/list-customers";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listCustomers, "customers", [
  ["Name", (customer) => customer.name],
  ["Telephone", (customer) => customer.phone],
  ["City", (customer) => customer.billingCity],
  ["State", (customer) => customer.billingState],
  ["Sites", (customer) => customer.sites],
]);
