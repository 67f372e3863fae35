import { saveMatrix } from "@/lib/services/sequences/save-matrix";
import { writeRoute } from "@/lib/web/route";

export const POST = writeRoute(saveMatrix);
