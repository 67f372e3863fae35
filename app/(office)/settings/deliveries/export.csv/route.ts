import { listDeadLetters } from "@/lib/services/messages/list-dead-letters";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listDeadLetters, "failed-deliveries", [
  ["Given up (UTC)", (letter) => letter.at?.toISOString()],
  ["What", (letter) => letter.what],
  ["To", (letter) => letter.to],
  ["Attempts", (letter) => letter.attempts],
  ["Why", (letter) => letter.lastError],
]);
