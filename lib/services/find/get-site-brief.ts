import { eq } from "drizzle-orm";
import { z } from "zod";
import { sites } from "@/db/schema/sites";
import { rowId } from "@/lib/domain/shared/inputs";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { BRIEF, siteBriefs } from "./site-briefs";

export const getSiteBrief = query({
  name: "find.site",
  needs: "find:read",
  input: z.object({ siteId: rowId }),
  async run({ tx, now }, { siteId }) {
    const found = await tx.select(BRIEF).from(sites).where(eq(sites.id, siteId));
    const [brief] = await siteBriefs(tx, found, now);
    if (!brief) throw notFound("site");
    return brief;
  },
});
