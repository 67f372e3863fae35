import { recordAnswer } from "@/lib/services/visits/record-answer";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(recordAnswer);
