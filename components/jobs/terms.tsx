import { CheckboxField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { Callout } from "@/components/ui/card";
import { dollarsOf, moneyWords } from "@/lib/domain/shared/money";

type Terms = { purchaseOrder: string | null; limitCents: number | null; noneNeeded: boolean };
type Props = { jobId: string; terms: Terms | null; demanded: boolean; action?: FormAction };

/** Asked before anybody drives: the number accounts payable will want, and how far the work may go. */
export function JobTerms({ jobId, terms, demanded, action }: Props) {
  return (
    <div className="grid gap-3">
      {terms ? (
        <p>{termsWords(terms)}</p>
      ) : (
        <Callout tone={demanded ? "alert" : "soon"}>
          <p>
            {demanded
              ? "This customer gives no work without a purchase order, and none is written down."
              : "Nobody has asked for a purchase order and a limit yet."}
          </p>
        </Callout>
      )}
      {action && (
        <Form action={action} className="grid max-w-2xl gap-4 sm:grid-cols-2">
          <input type="hidden" name="jobId" value={jobId} />
          <TextField label="Purchase order" name="purchaseOrder" optional defaultValue={terms?.purchaseOrder} />
          <TextField
            label="Not to exceed, in dollars"
            name="limit"
            inputMode="decimal"
            optional
            defaultValue={terms?.limitCents ? dollarsOf(terms.limitCents) : undefined}
          />
          <CheckboxField
            label="Asked: neither is needed"
            name="noneNeeded"
            defaultChecked={terms?.noneNeeded ?? false}
          />
          <SubmitButton variant="quiet" className="self-center justify-self-start">
            Save
          </SubmitButton>
        </Form>
      )}
    </div>
  );
}

function termsWords({ purchaseOrder, limitCents, noneNeeded }: Terms): string {
  if (noneNeeded) return "None needed: asked, and answered.";
  const order = purchaseOrder ? `Purchase order ${purchaseOrder}` : "No purchase order";
  return limitCents ? `${order}, not to exceed ${moneyWords(limitCents)}` : `${order}, no limit`;
}
