import { getRunSheet } from "@/lib/services/visits/get-run-sheet";
import { readRoute } from "@/lib/web/route";

export const GET = readRoute(getRunSheet);
