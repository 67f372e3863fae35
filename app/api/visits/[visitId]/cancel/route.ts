import { cancelVisit } from "@/lib/services/visits/cancel-visit";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(cancelVisit);
