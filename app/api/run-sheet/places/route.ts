import { getPlaces } from "@/lib/services/planning/get-places";
import { readRoute } from "@/lib/web/route";

export const GET = readRoute(getPlaces);
