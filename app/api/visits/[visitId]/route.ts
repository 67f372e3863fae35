import { getVisit } from "@/lib/services/visits/get-visit";
import { readRoute } from "@/lib/web/route";

export const GET = readRoute(getVisit);
