"use server";

import { updateCompany } from "@/lib/services/company/update-company";
import { retryDeadLetter } from "@/lib/services/messages/retry-dead-letter";
import { action } from "@/lib/web/action";

export const updateCompanyAction = action(updateCompany, { done: "Company saved" });
export const retryDeadLetterAction = action(retryDeadLetter, { done: "It will be tried again now" });
