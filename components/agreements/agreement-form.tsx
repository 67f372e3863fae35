"use client";

import { CheckboxField, SelectField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";

type Agreement = {
  id: string;
  name: string;
  startsOn: string;
  endsOn: string | null;
  purchaseOrderNeeded: boolean;
  purchaseOrder: string | null;
};
type Props = {
  action: FormAction;
  today: string;
  /** To choose from, for a new one. */
  customers?: readonly { id: string; name: string }[];
  customerId?: string;
  agreement?: Agreement;
};

export function AgreementForm({ action, today, customers, customerId, agreement }: Props) {
  return (
    <Form action={action} className="grid max-w-2xl gap-4">
      {agreement && <input type="hidden" name="agreementId" value={agreement.id} />}
      {customers && (
        <SelectField label="Customer" name="customerId" defaultValue={customerId ?? ""}>
          <option value="">Choose</option>
          {customers.map((customer) => (
            <option key={customer.id} value={customer.id}>
              {customer.name}
            </option>
          ))}
        </SelectField>
      )}
      <TextField
        label="Name"
        name="name"
        defaultValue={agreement?.name}
        hint="As the customer knows it: Yearly testing, north campus"
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField label="First day" name="startsOn" type="date" defaultValue={agreement?.startsOn ?? today} />
        <TextField label="Last day" name="endsOn" type="date" optional defaultValue={agreement?.endsOn} />
      </div>
      <CheckboxField
        label="No work without a purchase order"
        name="purchaseOrderNeeded"
        defaultChecked={agreement?.purchaseOrderNeeded}
      />
      <TextField
        label="Purchase order for the whole agreement"
        name="purchaseOrder"
        optional
        defaultValue={agreement?.purchaseOrder}
      />
      <SubmitButton className="justify-self-start">{agreement ? "Save" : "Add agreement"}</SubmitButton>
    </Form>
  );
}
