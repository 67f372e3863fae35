import { lookAtSecret } from "@/lib/services/sites/look-at-secret";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(lookAtSecret);
