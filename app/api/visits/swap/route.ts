import { swapVisits } from "@/lib/services/visits/swap-visits";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(swapVisits);
