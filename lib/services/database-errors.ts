import { AppError, type FieldErrors } from "@/lib/errors";

type Refusal = { code: string; constraint_name?: string };

/** What a refused constraint means to the person who ran into it. */
const CONSTRAINT_WORDS: Record<string, string> = {
  customers_name_unique: "There is already a customer of that name",
  job_waits_once: "The job waits for that already",
  jobs_occurrence_once: "The job for this occurrence is there already",
  equipment_tag_unique: "There is already equipment with that tag",
  matrix_cells_once: "That cell is there already",
  matrix_versions_company_id_system_id_number_pk:
    "Somebody has saved a version in the meantime. Look at it, then change that one",
  output_groups_key_unique: "There is already a group with that key",
  outputs_address_unique: "There is already an output at that address",
  points_address_unique: "There is already a device at that address",
  systems_key_unique: "There is already a system with that key at the site",
  zones_key_unique: "There is already a zone with that key",
  licenses_number_unique: "That license number is already recorded",
  member_details_email_unique: "Somebody with that e-mail address is already here",
  members_user_unique: "That person is already a member",
  site_holders_once: "That customer already holds the site in this capacity at that time",
  site_holders_one_payer: "Somebody else already pays for the site at that time",
  sites_address_unique: "There is already a site of that name at that address",
  visit_crew_once: "That person is already on the crew",
  visit_crew_one_place: "That person is already booked at that time",
};

/** The field whose value is taken. */
const CONSTRAINT_FIELDS: Record<string, string> = {
  equipment_tag_unique: "tag",
  output_groups_key_unique: "key",
  outputs_address_unique: "address",
  points_address_unique: "address",
  systems_key_unique: "key",
  zones_key_unique: "key",
};

const CODES: Record<string, (refusal: Refusal) => AppError> = {
  CD401: () => new AppError("unauthenticated", "Please sign in"),
  "23505": (r) => new AppError("conflict", words(r, "That exists already"), fields(r)),
  "23P01": (r) => new AppError("conflict", words(r, "That overlaps with something that is already there")),
  "23503": () => new AppError("not_found", "Something that this refers to does not exist"),
  "23514": () => new AppError("invalid", "The database refused a value that is out of range"),
  "40P01": () => new AppError("conflict", "Somebody else changed the same at that moment; try again"),
  "42501": () => new AppError("forbidden", "You may not do that"),
};

const words = (refusal: Refusal, otherwise: string) => CONSTRAINT_WORDS[refusal.constraint_name ?? ""] ?? otherwise;

function fields(refusal: Refusal): FieldErrors {
  const field = CONSTRAINT_FIELDS[refusal.constraint_name ?? ""];
  return field ? { [field]: [words(refusal, "")] } : {};
}

/** The database's refusals in our own vocabulary; what is not a refusal stays what it was. */
export function translated(error: unknown): unknown {
  // By shape, not by class: pages and routes are bundled apart and share one pool.
  const cause = error instanceof Error && error.cause ? error.cause : error;
  if (cause === null || typeof cause !== "object" || !("code" in cause)) return error;
  const refusal = cause as Refusal;
  return CODES[refusal.code]?.(refusal) ?? error;
}
