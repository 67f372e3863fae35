import { getFieldDay } from "@/lib/services/visits/get-field-day";
import { readRoute } from "@/lib/web/route";

export const GET = readRoute(getFieldDay);
