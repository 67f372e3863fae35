import { moveVisit } from "@/lib/services/visits/move-visit";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(moveVisit);
