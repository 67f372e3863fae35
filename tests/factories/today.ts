import { toLocalTime } from "@/lib/domain/shared/zone";
import { AppError } from "@/lib/errors";
import type { Person } from "./company";
import { newSite, newVisit, type World } from "./world";

const HOUR_MS = 3_600_000;

/**
 * A visit of ten minutes at a new site, so many hours from now by the database's clock, which alone decides who may
 * look up a code. A technician who is elsewhere just then comes a little later.
 */
export async function visitInHours(w: World, technician: Person, hours: number) {
  const { siteId } = await newSite(w.company, w.customer.customerId);
  for (const later of [0, 0.5, 1, 2, 5]) {
    const startsAt = new Date(Date.now() + (hours + later) * HOUR_MS);
    const [starts, ends] = [startsAt, new Date(startsAt.getTime() + 600_000)].map((at) =>
      toLocalTime(at, "America/Chicago"),
    );
    try {
      return { siteId, ...(await newVisit(w.company, siteId, [technician], starts ?? "", ends ?? "")) };
    } catch (error) {
      if (!(error instanceof AppError)) throw error;
    }
  }
  throw new Error("the technician is never free");
}

/** One for each world: nobody is in two places at a time. */
const sites = new WeakMap<World, Promise<{ siteId: string }>>();

/** A site that the world's technician visits today. */
export async function siteOfToday(w: World): Promise<string> {
  const visit = sites.get(w) ?? visitInHours(w, w.technician, 1);
  sites.set(w, visit);
  return (await visit).siteId;
}
