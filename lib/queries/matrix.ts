import type { MatrixCell } from "@/lib/domain/sequences/matrix";
import { postJson } from "./get-json";

type Changes = { basedOn: number; note: string; removed: readonly MatrixCell[]; added: readonly MatrixCell[] };

export const saveMatrix = (systemId: string, changes: Changes) =>
  postJson<{ number: number }>(`/api/systems/${systemId}/matrix`, changes);
