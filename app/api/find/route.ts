import { find } from "@/lib/services/find/find";
import { readRoute } from "@/lib/web/route";

export const GET = readRoute(find);
