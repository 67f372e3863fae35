import { getReasons } from "@/lib/services/visits/get-reasons";
import { readRoute } from "@/lib/web/route";

export const GET = readRoute(getReasons);
