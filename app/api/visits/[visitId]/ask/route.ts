import { askForVisit } from "@/lib/services/visits/ask";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(askForVisit);
