"use server";

import { paths } from "@/lib/domain/shared/paths";
import { createSite } from "@/lib/services/sites/create-site";
import { updateSite } from "@/lib/services/sites/update-site";
import { action } from "@/lib/web/action";

export const createSiteAction = action(createSite, { to: ({ siteId }) => paths.site(siteId) });
export const updateSiteAction = action(updateSite, { done: "Site saved" });
