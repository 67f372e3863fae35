import type { z } from "zod";
import { optionalText } from "@/lib/domain/shared/inputs";
import { SiteInput } from "@/lib/domain/sites/schemas";
import { SITE_KIND_WORDS, SITE_KINDS } from "@/lib/domain/sites/words";
import {
  EquipmentInput,
  GroupInput,
  OutputInput,
  PointInput,
  SystemInput,
  ZoneInput,
} from "@/lib/domain/systems/schemas";
import * as words from "@/lib/domain/systems/words";
import { type Column, choice, column, count, dateCell } from "./columns";

/** In this order, so that each refers only to those before it. */
export const LIST_NAMES = [
  "sites",
  "systems",
  "zones",
  "output_groups",
  "points",
  "outputs",
  "equipment",
  "matrix",
] as const;
export type ListName = (typeof LIST_NAMES)[number];

const keyText = optionalText(60);
const site = column("site", keyText, "Key of the site; may be empty where there is only one.", {
  also: ["site key", "building", "premises"],
});
const system = column("system", keyText, "Key of the system; may be empty where there is only one.", {
  also: ["system key", "panel", "node", "control unit"],
});
const location = column("location", optionalText(), "Where in the building.", { also: ["place", "room", "floor"] });
const removedOn = column("removed on", dateCell, "The date on which it was taken away. Empty: it is there.", {
  also: ["removed", "taken away"],
});
const lastProven = column("last proven", dateCell, "The date on which it was last seen to work.", {
  also: ["last tested", "last test", "last passed", "date tested"],
});
const method = column("method", optionalText(), "How that was seen: smoke, magnet, key, meter …", {
  also: ["test method", "how"],
});
const signal = column(
  "signal",
  choice(words.SIGNALS, words.SIGNAL_WORDS, "alarm"),
  "What the panel makes of it. Empty: alarm.",
  { also: ["signal type", "event"] },
);
const label = column("label", PointInput.shape.label, "The text at the panel.", {
  required: true,
  also: ["text at the panel", "description", "label text", "panel text", "message", "device label", "custom label"],
});

const sites = {
  site: column("site", SystemInput.shape.key, "Your own key of the site, the same at every import.", {
    required: true,
    also: ["site key", "building", "premises", "building number", "site number"],
  }),
  name: column("name", SiteInput.shape.name, "What people call it.", {
    required: true,
    also: ["site name", "building name"],
  }),
  kind: column("kind", choice(SITE_KINDS, SITE_KIND_WORDS, "other"), "Empty: other.", {
    also: ["type", "use", "occupancy"],
  }),
  street: column("street", SiteInput.shape.street, "Street and number.", {
    required: true,
    also: ["address", "street address"],
  }),
  city: column("city", SiteInput.shape.city, "City or town.", { required: true, also: ["town"] }),
  state: column("state", SiteInput.shape.state, "Two letters, as in mail.", { required: true }),
  postalCode: column("postal code", SiteInput.shape.postalCode, "Five digits, or five and four.", {
    required: true,
    also: ["zip", "zip code", "postcode"],
  }),
  zone: column("time zone", SiteInput.shape.zone, "By its IANA name, like America/Los_Angeles.", {
    required: true,
    also: ["timezone", "tz"],
  }),
  latitude: column("latitude", SiteInput.shape.latitude, "In degrees.", { also: ["lat"] }),
  longitude: column("longitude", SiteInput.shape.longitude, "In degrees, west is negative.", {
    also: ["lon", "lng", "long"],
  }),
  authorityName: column("authority", SiteInput.shape.authorityName, "Who approves and inspects there.", {
    also: ["authority having jurisdiction", "fire marshal"],
  }),
  authorityPhone: column("authority telephone", SiteInput.shape.authorityPhone, "How to reach them.", {
    also: ["authority phone"],
  }),
};

const systems = {
  site,
  system: column("system", SystemInput.shape.key, "Your own key of the system, the same at every import.", {
    required: true,
    also: ["system key", "panel", "node", "control unit"],
  }),
  name: column("name", SystemInput.shape.name, "As people there call it.", {
    required: true,
    also: ["system name", "panel name"],
  }),
  maker: column("maker", SystemInput.shape.maker, "Who made the control unit.", { also: ["manufacturer", "brand"] }),
  model: column("model", SystemInput.shape.model, "Its model.", { also: ["panel model", "type"] }),
  location: column("location", SystemInput.shape.location, "Where the panel hangs.", { also: location.also }),
};

const zones = {
  site,
  system,
  zone: column("zone", ZoneInput.shape.key, "The zone's key or number.", {
    required: true,
    also: ["zone key", "zone number", "zone no", "number"],
  }),
  name: column("name", ZoneInput.shape.name, "What it covers.", {
    required: true,
    also: ["zone name", "description", "label"],
  }),
};

const outputGroups = {
  site,
  system,
  group: column("group", GroupInput.shape.key, "The group's key.", {
    required: true,
    also: ["output group", "group key", "control group"],
  }),
  name: column("name", GroupInput.shape.name, "What it is.", {
    required: true,
    also: ["group name", "description", "label"],
  }),
  function: column("function", choice(words.FUNCTIONS, words.FUNCTION_WORDS), "What must happen.", {
    required: true,
    also: ["what happens", "type", "kind"],
  }),
  lastProven,
  method,
};

const points = {
  site,
  system,
  address: column("address", PointInput.shape.address, "Loop and number, as the panel writes it.", {
    required: true,
    also: ["device address", "point", "point address", "loop address", "device", "device id"],
  }),
  zone: column("zone", keyText, "Key of its zone. Empty: in none.", { also: ["zone key", "zone number", "zone no"] }),
  kind: column("kind", choice(words.POINT_KINDS, words.POINT_KIND_WORDS), "What it is.", {
    required: true,
    also: ["type", "device type", "type code", "device kind"],
  }),
  label,
  location,
  signal,
  walkOrder: column("walk order", PointInput.shape.walkOrder, "Its place on the walk through the building.", {
    also: ["order", "route", "sequence"],
  }),
  removedOn,
  lastProven,
  method,
};

const outputs = {
  site,
  system,
  address: column("address", OutputInput.shape.address, "Of the relay or circuit.", {
    required: true,
    also: ["output address", "output", "relay", "circuit"],
  }),
  group: column("group", OutputInput.shape.address, "Key of its output group.", {
    required: true,
    also: ["output group", "group key", "control group"],
  }),
  kind: column("kind", choice(words.OUTPUT_KINDS, words.OUTPUT_KIND_WORDS, "relay"), "Empty: relay.", {
    also: ["type", "output type"],
  }),
  label,
  location,
  removedOn,
};

const equipment = {
  site,
  system,
  tag: column("tag", EquipmentInput.shape.tag, "The building's own tag, like AHU-3.", {
    required: true,
    also: ["equipment tag", "unit", "equipment", "asset"],
  }),
  output: column("output", OutputInput.shape.address, "Address of the output that operates it.", {
    required: true,
    also: ["output address", "relay", "address"],
  }),
  kind: column("kind", choice(words.EQUIPMENT_KINDS, words.EQUIPMENT_KIND_WORDS), "What it is.", {
    required: true,
    also: ["type", "equipment type"],
  }),
  action: column("action", choice(words.ACTIONS, words.ACTION_WORDS), "What it must do.", {
    required: true,
    also: ["required action", "does"],
  }),
  location,
  serves: column("serves", EquipmentInput.shape.serves, "What it serves.", { also: ["area served", "serving"] }),
  restart: column(
    "restart",
    choice(words.RESTART_MODES, words.RESTART_MODE_WORDS, "unknown"),
    "How it comes back after the reset. Empty: unknown.",
    { also: ["restart mode"] },
  ),
  longestOffMinutes: column("longest off minutes", EquipmentInput.shape.longestOffMinutes, "How long it may be off.", {
    also: ["longest off", "max off minutes"],
  }),
  minutesBetweenStarts: column(
    "minutes between starts",
    EquipmentInput.shape.minutesBetweenStarts,
    "The least time from start to start.",
    { also: ["time between starts"] },
  ),
  removedOn,
  lastProven,
  method,
};

const matrix = {
  site,
  system,
  zone: column("zone", keyText, "The input: key of a zone …", { also: ["zone key", "zone number", "input zone"] }),
  address: column("address", optionalText(60), "… or address of a single point. One of both.", {
    also: ["point", "point address", "device address", "input", "input address"],
  }),
  group: column("group", GroupInput.shape.key, "Key of the output group that it operates.", {
    required: true,
    also: ["output group", "group key", "operates", "output"],
  }),
  signal,
  source: column(
    "source",
    choice(words.EXPECTATION_SOURCES, words.EXPECTATION_SOURCE_WORDS),
    "Where the expectation comes from.",
    { required: true, also: ["from", "basis"] },
  ),
  delaySeconds: column("delay seconds", count(0, 86_400), "From the signal to the operation. Empty: 0.", {
    also: ["delay", "delay s"],
  }),
};

type Definition<C extends Record<string, Column>> = { title: string; note: string; columns: C };
const list = <C extends Record<string, Column>>(title: string, note: string, columns: C): Definition<C> => ({
  title,
  note,
  columns,
});

/** Our form: eight lists, each a CSV file with these columns, in any order. */
export const LISTS = {
  sites: list("Sites", "Buildings or premises, one a row.", sites),
  systems: list("Systems", "Control units, one a row.", systems),
  zones: list("Zones", "Groups of initiating devices.", zones),
  output_groups: list("Output groups", "What the panel operates together.", outputGroups),
  points: list("Points", "Initiating devices: detectors, pull stations, switches.", points),
  outputs: list("Outputs", "Relays and circuits, each in a group.", outputs),
  equipment: list("Equipment", "What the outputs control: fans, dampers, doors, elevators.", equipment),
  matrix: list(
    "Matrix",
    "Which zone or point operates which group. Replaces the matrix of every system it names.",
    matrix,
  ),
};

type Lists = typeof LISTS;
export type RowOf<L extends ListName> = {
  [C in keyof Lists[L]["columns"]]: Lists[L]["columns"][C] extends Column<infer S> ? z.output<S> : never;
};

/** The columns of a list where it does not matter which list it is. */
export const columnsOf = (name: ListName): Record<string, Column> => LISTS[name].columns;
