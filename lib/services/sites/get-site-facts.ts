import { and, asc, count, desc, eq, gte, isNull } from "drizzle-orm";
import { z } from "zod";
import type { Tx } from "@/db/client";
import { contacts } from "@/db/schema/customers";
import { jobs } from "@/db/schema/jobs";
import { siteDocuments, siteKeys, siteSecrets, stationAccounts } from "@/db/schema/sites";
import { points, systems } from "@/db/schema/systems";
import { attendances, noTestDates, testWindows } from "@/db/schema/windows";
import { rowId } from "@/lib/domain/shared/inputs";
import { calendarDate } from "@/lib/domain/shared/zone";
import { query } from "@/lib/services/command";
import { siteById } from "./internal";

const JOBS_SHOWN = 20;

/** What is kept about a site beside its address and its people; ended entries are left to the audit trail. */
export const getSiteFacts = query({
  name: "site.facts",
  needs: "site:read",
  input: z.object({ siteId: rowId }),
  async run({ tx, now }, { siteId }) {
    const { zone } = await siteById(tx, siteId);
    const today = calendarDate(now, zone);
    return {
      now,
      today,
      ...(await registersOf(tx, siteId)),
      ...(await timesOf(tx, siteId, today)),
      ...(await workOf(tx, siteId)),
    };
  },
});

async function registersOf(tx: Tx, siteId: string) {
  return {
    stationAccounts: await tx
      .select()
      .from(stationAccounts)
      .where(and(eq(stationAccounts.siteId, siteId), isNull(stationAccounts.endedAt)))
      .orderBy(asc(stationAccounts.station)),
    keys: await tx
      .select()
      .from(siteKeys)
      .where(and(eq(siteKeys.siteId, siteId), isNull(siteKeys.endedAt)))
      .orderBy(asc(siteKeys.label)),
    documents: await tx
      .select()
      .from(siteDocuments)
      .where(and(eq(siteDocuments.siteId, siteId), isNull(siteDocuments.endedAt)))
      .orderBy(asc(siteDocuments.kind), desc(siteDocuments.dated)),
    // Never `sealed`: a code is opened by a look of its own.
    secrets: await tx
      .select({
        id: siteSecrets.id,
        kind: siteSecrets.kind,
        label: siteSecrets.label,
        createdAt: siteSecrets.createdAt,
      })
      .from(siteSecrets)
      .where(and(eq(siteSecrets.siteId, siteId), isNull(siteSecrets.endedAt)))
      .orderBy(asc(siteSecrets.kind), asc(siteSecrets.label)),
  };
}

async function timesOf(tx: Tx, siteId: string, today: string) {
  return {
    windows: await tx
      .select()
      .from(testWindows)
      .where(and(eq(testWindows.siteId, siteId), isNull(testWindows.endedAt)))
      .orderBy(asc(testWindows.startsLocal), asc(testWindows.id)),
    noTestDates: await tx
      .select()
      .from(noTestDates)
      .where(and(eq(noTestDates.siteId, siteId), isNull(noTestDates.endedAt), gte(noTestDates.toDate, today)))
      .orderBy(asc(noTestDates.fromDate)),
    attendances: await tx
      .select({
        id: attendances.id,
        functions: attendances.functions,
        party: attendances.party,
        phone: attendances.phone,
        contact: { id: contacts.id, name: contacts.name, phone: contacts.phone },
      })
      .from(attendances)
      .leftJoin(contacts, and(eq(contacts.companyId, attendances.companyId), eq(contacts.id, attendances.contactId)))
      .where(and(eq(attendances.siteId, siteId), isNull(attendances.endedAt)))
      .orderBy(asc(attendances.party)),
  };
}

async function workOf(tx: Tx, siteId: string) {
  const devices = tx
    .select({ systemId: points.systemId, devices: count().as("devices") })
    .from(points)
    .innerJoin(systems, and(eq(systems.companyId, points.companyId), eq(systems.id, points.systemId)))
    .where(and(eq(systems.siteId, siteId), isNull(points.removedOn)))
    .groupBy(points.systemId)
    .as("devices_of_system");
  return {
    systems: await tx
      .select({
        id: systems.id,
        name: systems.name,
        maker: systems.maker,
        model: systems.model,
        location: systems.location,
        devices: devices.devices,
      })
      .from(systems)
      .leftJoin(devices, eq(devices.systemId, systems.id))
      .where(eq(systems.siteId, siteId))
      .orderBy(asc(systems.name)),
    jobs: await tx
      .select({
        id: jobs.id,
        number: jobs.number,
        kind: jobs.kind,
        title: jobs.title,
        canceledAt: jobs.canceledAt,
        doneOn: jobs.doneOn,
        targetOn: jobs.targetOn,
      })
      .from(jobs)
      .where(eq(jobs.siteId, siteId))
      .orderBy(desc(jobs.number))
      .limit(JOBS_SHOWN),
  };
}
