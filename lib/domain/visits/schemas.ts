import { z } from "zod";
import { optionalText, requiredText, rowId } from "@/lib/domain/shared/inputs";
import { FUNCTIONS } from "@/lib/domain/systems/words";
import { ANSWERS, CHANNELS, SLOT_REASONS } from "./words";

const localTime = z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/, "That is not a date and time");
const LONGEST_VISIT_MINUTES = 24 * 60;
const minutes = z.coerce
  .number({ error: "How many minutes?" })
  .int("Whole minutes")
  .min(5, "Five minutes at least")
  .max(LONGEST_VISIT_MINUTES, "A visit lasts a day at most; make it two");

/** Distinct people; the first leads. */
const crew = z
  .array(rowId)
  .min(1, "Choose who goes")
  .max(20)
  .refine((ids) => new Set(ids).size === ids.length, "The same person is chosen twice");

export const LiveBlockInput = z.object({
  offsetMinutes: z.coerce.number().int().min(0, "The live block begins before the visit"),
  minutes,
  functions: z.array(z.enum(FUNCTIONS)).min(1, "Which functions operate?"),
  /** Who stands by, in the building's words. */
  attendees: z.array(requiredText("Who stands by")).max(20).default([]),
});
export type LiveBlockInput = z.infer<typeof LiveBlockInput>;

const liveBlocks = z.array(LiveBlockInput).max(20);

const override = z.object({ code: z.enum(SLOT_REASONS), note: requiredText("Why", 500) });
const overrides = z.array(override).max(SLOT_REASONS.length).default([]);
export type OverrideInput = z.infer<typeof override>;

export const PlanVisitInput = z.object({
  jobId: rowId,
  startsLocal: localTime,
  minutes,
  crew,
  liveBlocks: liveBlocks.default([]),
  overrides,
  /** Contacts who are asked to agree, at once. */
  ask: z.array(rowId).max(50).default([]),
});

/** The state that whoever decides has seen: a visit that others changed meanwhile is looked at again first. */
const seen = { visitId: rowId, sequence: z.coerce.number().int().min(0) };

export const MoveVisitInput = z.object({
  ...seen,
  startsLocal: localTime.optional(),
  minutes: minutes.optional(),
  crew: crew.optional(),
  liveBlocks: liveBlocks.optional(),
  overrides,
});

export const SwapVisitsInput = z
  .object({ first: z.object(seen), second: z.object(seen), exchange: z.enum(["crews", "times"]), overrides })
  .refine(({ first, second }) => first.visitId !== second.visitId, {
    path: ["second"],
    error: "Choose two different visits",
  });

export const CancelVisitInput = z.object({ visitId: rowId, reason: requiredText("The reason", 500) });

export const AskInput = z.object({
  visitId: rowId,
  /** Without any: everybody who speaks for the site. */
  contactIds: z.array(rowId).max(50).optional(),
});

const answer = {
  answer: z.enum(ANSWERS, { error: "Acknowledge or decline" }),
  permitNumber: optionalText(100),
  note: optionalText(1000),
};

/** From a signed link the link says which ask; somebody signed in names it. */
export const AnswerInput = z.object({ askId: rowId.optional(), ...answer });

export const RecordAnswerInput = z
  .object({
    visitId: rowId,
    /** The ask that is answered; without one, an answer of somebody else, by name. */
    askId: z.preprocess((value) => (value === "" ? undefined : value), rowId.optional()),
    name: optionalText(),
    answeredLocal: localTime,
    channel: z.enum(CHANNELS, { error: "How did the answer come?" }),
    ...answer,
  })
  .refine(({ askId, name }) => Boolean(askId ?? name), { path: ["name"], error: "Who answered?" });

/** A list in an address: `a,b,c`. */
const commaList = z.preprocess(
  (value) => (typeof value === "string" ? value.split(",").filter(Boolean) : value),
  z.array(rowId).max(20).default([]),
);
const jsonText = <T extends z.ZodType>(schema: T) =>
  z.preprocess((value, context) => {
    if (typeof value !== "string") return value;
    try {
      return JSON.parse(value);
    } catch {
      context.addIssue("That cannot be read");
      return z.NEVER;
    }
  }, schema);

/** Which visit is to be placed: a new one of a job, or one that moves. */
const wanted = { jobId: rowId.optional(), visitId: rowId.optional() };
const oneOfBoth = {
  check: (input: { jobId?: string; visitId?: string }) => (input.jobId === undefined) !== (input.visitId === undefined),
  words: "Name a job or a visit",
};

export const PlacesInput = z
  .object({
    ...wanted,
    date: z.iso.date("That is not a date"),
    days: z.coerce.number().int().min(1).max(7).default(1),
    helpers: commaList,
    stepMinutes: z.coerce
      .number()
      .refine((step) => step === 15 || step === 30, "15 or 30")
      .default(30),
    minutes: minutes.optional(),
    liveMinutes: minutes.optional(),
  })
  .refine(oneOfBoth.check, oneOfBoth.words);

export const ReasonsInput = z
  .object({
    ...wanted,
    startsLocal: localTime,
    minutes,
    crew: commaList,
    liveBlocks: jsonText(liveBlocks.default([])),
  })
  .refine(oneOfBoth.check, oneOfBoth.words);
