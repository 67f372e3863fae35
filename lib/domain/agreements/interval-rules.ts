import type { Frequency } from "./words";

/** The step of each frequency. Months are calendar months, with the end of a short month in place of a missing day. */
export const STEPS: Record<Frequency, { months: number } | { days: number }> = {
  weekly: { days: 7 },
  monthly: { months: 1 },
  quarterly: { months: 3 },
  semiannual: { months: 6 },
  annual: { months: 12 },
  two_yearly: { months: 24 },
  three_yearly: { months: 36 },
  four_yearly: { months: 48 },
  five_yearly: { months: 60 },
  six_yearly: { months: 72 },
  ten_yearly: { months: 120 },
};

/** How far around the target an occurrence may lie. */
export type Tolerance = (
  | { kind: "calendar_week" }
  | { kind: "calendar_month" }
  /** Not sooner and not later than so many months after the last completion. */
  | { kind: "gap"; minMonths: number; maxMonths: number }
  /** One step after the day of the last completion, give or take so many days. */
  | { kind: "after_day"; days: number }
  /** One step after the month of the last completion, give or take so many days at the month's two ends. */
  | { kind: "after_month"; days: number }
  /** The target as agreed, give or take so many days, whenever the last one was done. */
  | { kind: "around_target"; days: number }
) & {
  /** Nobody here has read this figure in a published page. */
  fromMemory?: true;
};

/** One reading of the frequencies. Tables change by edition and by state: nothing here is a constant of the product. */
export type IntervalRule = {
  key: string;
  title: string;
  edition: string;
  jurisdiction: string;
  /** A published page that says so; null where the parties themselves say it. */
  source: string | null;
  tolerances: Partial<Record<Frequency, Tolerance>>;
};

const NFPA_72: IntervalRule = {
  key: "nfpa_72",
  title: "NFPA 72, definitions of chapter 3",
  edition: "2010, 3.3.106; renumbered since",
  jurisdiction: "Where NFPA 72 is adopted; fire alarm systems only",
  source: "https://keyeslifesafety.com/category/fire-detection-systems/testing-fire-detection-systems/",
  tolerances: {
    weekly: { kind: "calendar_week" },
    monthly: { kind: "calendar_month" },
    quarterly: { kind: "gap", minMonths: 2, maxMonths: 4 },
    semiannual: { kind: "gap", minMonths: 4, maxMonths: 8 },
    annual: { kind: "gap", minMonths: 9, maxMonths: 15 },
  },
};

const NFPA_25: IntervalRule = {
  key: "nfpa_25",
  title: "NFPA 25, definitions of chapter 3",
  edition: "in outline as explained in 2022; figures from memory",
  jurisdiction: "Where NFPA 25 is adopted; water-based systems",
  source:
    "https://www.nfpa.org/News-and-Research/Publications-and-media/Blogs-Landing-Page/NFPA-Today/Blog-Posts/2022/02/04/Sprinkler-System-Inspections-Testing-and-Maintenance-Frequencies-Explained",
  tolerances: {
    weekly: { kind: "calendar_week" },
    monthly: { kind: "calendar_month" },
    quarterly: { kind: "gap", minMonths: 2, maxMonths: 4, fromMemory: true },
    semiannual: { kind: "gap", minMonths: 4, maxMonths: 8, fromMemory: true },
    annual: { kind: "gap", minMonths: 9, maxMonths: 15, fromMemory: true },
    three_yearly: { kind: "gap", minMonths: 30, maxMonths: 40, fromMemory: true },
    five_yearly: { kind: "gap", minMonths: 54, maxMonths: 66, fromMemory: true },
  },
};

const HOSPITAL_BY_DAY: IntervalRule = {
  key: "hospital_by_day",
  title: "Hospital accreditor, counted from the day",
  edition: "2014",
  jurisdiction: "Accredited hospitals, United States",
  source: "https://editthis.info/gvrahe/Acceptable_PM_Completion_Timelines",
  tolerances: {
    quarterly: { kind: "after_day", days: 10 },
    semiannual: { kind: "after_day", days: 20 },
    annual: { kind: "after_day", days: 30 },
    three_yearly: { kind: "after_day", days: 45, fromMemory: true },
  },
};

/** The rival reading of the same sentence. The published example shows the quarterly window; the others follow it. */
const HOSPITAL_BY_MONTH: IntervalRule = {
  key: "hospital_by_month",
  title: "Hospital accreditor, counted from the month",
  edition: "2014, rival reading",
  jurisdiction: "Accredited hospitals, United States",
  source: "http://keyeslifesafety.com/joint-commission-quarterly-testing-requirements/",
  tolerances: {
    quarterly: { kind: "after_month", days: 10 },
    semiannual: { kind: "after_month", days: 20, fromMemory: true },
    annual: { kind: "after_month", days: 30, fromMemory: true },
    three_yearly: { kind: "after_month", days: 45, fromMemory: true },
  },
};

export const BY_AGREEMENT = "by_agreement";
export const RULE_KEYS = [NFPA_72.key, NFPA_25.key, HOSPITAL_BY_DAY.key, HOSPITAL_BY_MONTH.key, BY_AGREEMENT] as const;

const PUBLISHED = [NFPA_72, NFPA_25, HOSPITAL_BY_DAY, HOSPITAL_BY_MONTH];

/** What the parties agreed themselves: the target, give or take `days`, at every frequency. */
function byAgreement(days: number): IntervalRule {
  const frequencies = Object.keys(STEPS) as Frequency[];
  return {
    key: BY_AGREEMENT,
    title: "As the agreement says",
    edition: "the agreement",
    jurisdiction: "The parties to it",
    source: null,
    tolerances: Object.fromEntries(frequencies.map((frequency) => [frequency, { kind: "around_target", days }])),
  };
}

/**
 * The rule of a key. `toleranceDays` counts for the agreement's own rule alone.
 * @throws RangeError if there is no such rule.
 */
export function intervalRule(key: string, toleranceDays: number | null): IntervalRule {
  const rule = key === BY_AGREEMENT ? byAgreement(toleranceDays ?? 0) : PUBLISHED.find((one) => one.key === key);
  if (!rule) throw new RangeError(`no interval rule ${key}`);
  return rule;
}
