import { z } from "zod";
import { calendarDateText, checked, optionalDate, optionalText, requiredText, rowId } from "@/lib/domain/shared/inputs";
import { dollars } from "@/lib/domain/shared/money";
import { FUNCTIONS } from "@/lib/domain/systems/words";
import { BY_AGREEMENT, intervalRule, RULE_KEYS } from "./interval-rules";
import { ANCHORS, FREQUENCIES, TEST_KINDS } from "./words";

const AgreementFacts = z.object({
  name: requiredText("Name"),
  startsOn: calendarDateText,
  endsOn: optionalDate,
  purchaseOrderNeeded: checked,
  purchaseOrder: optionalText(60),
});

const inOrder = { path: ["endsOn"], error: "The last day lies before the first" };
type Dates = { startsOn: string; endsOn: string | null };
const datesInOrder = ({ startsOn, endsOn }: Dates): boolean => endsOn === null || endsOn >= startsOn;

export const CreateAgreementInput = AgreementFacts.extend({
  customerId: z.uuid({ error: "Choose a customer" }),
}).refine(datesInOrder, inOrder);
export const UpdateAgreementInput = AgreementFacts.extend({ agreementId: rowId }).refine(datesInOrder, inOrder);
export const EndAgreementInput = z.object({ agreementId: rowId, endsOn: calendarDateText });

export const crewSize = z.coerce.number({ error: "Give a number" }).int().min(1, "At least one").max(20, "At most 20");
export const visitMinutes = z.coerce
  .number({ error: "Give minutes" })
  .int("Whole minutes")
  .min(5, "At least 5 minutes")
  .max(6000, "At most 100 hours");
export const functionList = z.array(z.enum(FUNCTIONS)).max(FUNCTIONS.length).default([]);

const blankToNull = (value: unknown) => (value === "" ? null : value);

const ItemFacts = z.object({
  systemId: z.preprocess(blankToNull, rowId.nullish().default(null)),
  testKind: z.enum(TEST_KINDS, { error: "Choose a kind of test" }),
  functions: functionList,
  frequency: z.enum(FREQUENCIES, { error: "Choose how often" }),
  rule: z.enum(RULE_KEYS, { error: "Choose a rule" }),
  toleranceDays: z.preprocess(
    blankToNull,
    z.coerce
      .number({ error: "Give days" })
      .int("Whole days")
      .min(0)
      .max(366, "At most 366 days")
      .nullish()
      .default(null),
  ),
  anchor: z.enum(ANCHORS, { error: "Choose what the next one counts from" }),
  anchorOn: calendarDateText,
  visitMinutes,
  crewSize,
  price: dollars,
});

type Item = Pick<z.output<typeof ItemFacts>, "rule" | "frequency" | "toleranceDays">;

/** A rule that does not speak of the frequency cannot be applied to it; the agreement's own needs its days. */
function speaks(item: Item, context: z.RefinementCtx): void {
  const issue = (path: string, message: string) => context.addIssue({ code: "custom", path: [path], message });
  if (item.rule === BY_AGREEMENT) {
    if (item.toleranceDays === null) issue("toleranceDays", "How many days either way?");
    return;
  }
  const rule = intervalRule(item.rule, null);
  if (!rule.tolerances[item.frequency]) {
    issue("rule", `${rule.title} says nothing of this frequency. Choose another rule, or say it in the agreement`);
  }
}

/** Days count for the agreement's own rule alone. */
const withoutStrayDays = <T extends Item>(item: T): T =>
  item.rule === BY_AGREEMENT ? item : { ...item, toleranceDays: null };

export const AddItemInput = ItemFacts.extend({
  agreementId: rowId,
  siteId: z.uuid({ error: "Choose a site" }),
  /** Done before we came; the first window counts from it. */
  lastDoneOn: optionalDate,
})
  .superRefine(speaks)
  .transform(withoutStrayDays);

export const ChangeItemInput = ItemFacts.extend({ itemId: rowId }).superRefine(speaks).transform(withoutStrayDays);
export const ItemRef = z.object({ itemId: rowId });
export const RecordCompletionInput = z.object({ itemId: rowId, doneOn: calendarDateText });
