"use server";

import { answerVisit } from "@/lib/services/visits/answer";
import { action } from "@/lib/web/action";

export const answerAction = action(answerVisit, { done: "Thank you, your answer is kept" });
