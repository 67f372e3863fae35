import { planVisit } from "@/lib/services/visits/plan-visit";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(planVisit);
