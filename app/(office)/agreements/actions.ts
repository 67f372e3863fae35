"use server";

import { paths } from "@/lib/domain/shared/paths";
import { addItem } from "@/lib/services/agreements/add-item";
import { changeItem } from "@/lib/services/agreements/change-item";
import { createAgreement } from "@/lib/services/agreements/create-agreement";
import { endAgreement } from "@/lib/services/agreements/end-agreement";
import { endItem } from "@/lib/services/agreements/end-item";
import { recordCompletion } from "@/lib/services/agreements/record-completion";
import { updateAgreement } from "@/lib/services/agreements/update-agreement";
import { action } from "@/lib/web/action";

export const createAgreementAction = action(createAgreement, { to: ({ agreementId }) => paths.agreement(agreementId) });
export const updateAgreementAction = action(updateAgreement, { done: "Agreement saved" });
export const endAgreementAction = action(endAgreement, { done: "Last day saved" });
export const addItemAction = action(addItem, { done: "Added to the agreement" });
export const changeItemAction = action(changeItem, { done: "Saved" });
export const endItemAction = action(endItem, { done: "Ended" });
export const recordCompletionAction = action(recordCompletion, { done: "Recorded" });
