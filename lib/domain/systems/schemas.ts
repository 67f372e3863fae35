import { z } from "zod";
import { calendarDateText, optionalText, requiredText, rowId } from "@/lib/domain/shared/inputs";
import {
  ACTIONS,
  EQUIPMENT_KINDS,
  EXPECTATION_SOURCES,
  FUNCTIONS,
  OUTPUT_KINDS,
  POINT_KINDS,
  RESTART_MODES,
  SIGNALS,
} from "./words";

const blankToNull = (value: unknown) => (value === "" || value === undefined ? null : value);
const optionalCount = (least: number) =>
  z.preprocess(
    blankToNull,
    z.union([
      z.null(),
      z.coerce
        .number({ error: "That is not a number" })
        .int("Whole numbers only")
        .min(least, `Not below ${least}`)
        .max(1_000_000, "That is too much"),
    ]),
  );
/** A choice that may be left open. */
const optionalId = z.preprocess(blankToNull, z.union([z.null(), rowId]));
const key = requiredText("Key", 60);

/** Without an id, a new one. */
const saved = { systemId: rowId, id: optionalId };

export const SystemInput = z.object({
  siteId: rowId,
  key,
  name: requiredText("Name"),
  maker: optionalText(),
  model: optionalText(),
  location: optionalText(),
});
export const ChangeSystemInput = SystemInput.omit({ siteId: true }).extend({ systemId: rowId });
export const SystemRef = z.object({ systemId: rowId });

export const ZoneInput = z.object({ ...saved, key, name: requiredText("Name") });

export const PointInput = z.object({
  ...saved,
  zoneId: optionalId,
  address: requiredText("Address", 60),
  kind: z.enum(POINT_KINDS, { error: "Choose a kind" }),
  label: requiredText("Text at the panel"),
  location: optionalText(),
  signal: z.enum(SIGNALS, { error: "Choose a signal" }).default("alarm"),
  walkOrder: optionalCount(0),
});

export const GroupInput = z.object({
  ...saved,
  key,
  name: requiredText("Name"),
  function: z.enum(FUNCTIONS, { error: "Choose a function" }),
});

export const OutputInput = z.object({
  ...saved,
  groupId: rowId,
  address: requiredText("Address", 60),
  kind: z.enum(OUTPUT_KINDS, { error: "Choose a kind" }),
  label: requiredText("Text at the panel"),
  location: optionalText(),
});

export const EquipmentInput = z.object({
  ...saved,
  outputId: rowId,
  tag: requiredText("Tag", 60),
  kind: z.enum(EQUIPMENT_KINDS, { error: "Choose a kind" }),
  action: z.enum(ACTIONS, { error: "Choose an action" }),
  location: optionalText(),
  serves: optionalText(),
  restart: z.enum(RESTART_MODES, { error: "Choose how it restarts" }).default("unknown"),
  longestOffMinutes: optionalCount(1),
  minutesBetweenStarts: optionalCount(0),
});

/** What can go from a building, and what was proven of it stays. */
export const REMOVABLE = ["point", "output", "equipment"] as const;
export const RemoveInput = z.object({
  systemId: rowId,
  entry: z.enum(REMOVABLE),
  id: rowId,
  removedOn: calendarDateText,
});
export const PutBackInput = RemoveInput.omit({ removedOn: true });

const cellKey = {
  zoneId: optionalId,
  pointId: optionalId,
  groupId: rowId,
  signal: z.enum(SIGNALS),
};
const ONE_INPUT = "A cell has one input: a zone or a device";
const oneInput = (cell: { zoneId: string | null; pointId: string | null }) =>
  (cell.zoneId === null) !== (cell.pointId === null);

export const SaveMatrixInput = z.object({
  systemId: rowId,
  /** The version that was looked at; 0 where there was none. */
  basedOn: z.coerce.number().int().min(0),
  note: requiredText("Note", 1000),
  removed: z.array(z.object(cellKey).refine(oneInput, ONE_INPUT)).max(50_000).default([]),
  added: z
    .array(
      z
        .object({
          ...cellKey,
          source: z.enum(EXPECTATION_SOURCES),
          delaySeconds: z.coerce.number().int().min(0).max(86_400),
        })
        .refine(oneInput, ONE_INPUT),
    )
    .max(50_000)
    .default([]),
});

export const MatrixRef = z.object({
  systemId: rowId,
  version: z.preprocess(blankToNull, z.union([z.null(), z.coerce.number().int().min(1)])),
});
