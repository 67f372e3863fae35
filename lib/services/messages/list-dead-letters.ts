import { count, desc, isNotNull } from "drizzle-orm";
import { outbox } from "@/db/schema/messages";
import { query } from "@/lib/services/command";
import { offsetOf, PAGE_SIZE, PageInput } from "@/lib/services/paging";

export const listDeadLetters = query({
  name: "delivery.list-dead",
  needs: "delivery:read",
  input: PageInput,
  async run({ tx }, { page }) {
    const where = isNotNull(outbox.deadAt);
    const rows = await tx
      .select()
      .from(outbox)
      .where(where)
      .orderBy(desc(outbox.deadAt))
      .limit(PAGE_SIZE)
      .offset(offsetOf(page));
    const [all] = await tx.select({ total: count() }).from(outbox).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize: PAGE_SIZE };
  },
});
