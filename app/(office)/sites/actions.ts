"use server";

import { paths } from "@/lib/domain/shared/paths";
import { addHolder } from "@/lib/services/sites/add-holder";
import { createSite } from "@/lib/services/sites/create-site";
import { endHolder } from "@/lib/services/sites/end-holder";
import { updateSite } from "@/lib/services/sites/update-site";
import { action } from "@/lib/web/action";

export const createSiteAction = action(createSite, { to: ({ siteId }) => paths.site(siteId) });
export const updateSiteAction = action(updateSite, { done: "Site saved" });
export const addHolderAction = action(addHolder, { done: "Holder added" });
export const endHolderAction = action(endHolder, { done: "Last date set" });
