"use client";

import { SelectField, TextareaField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { US_STATES } from "@/lib/domain/shared/inputs";

type Customer = {
  id: string;
  name: string;
  phone: string | null;
  billingStreet: string | null;
  billingCity: string | null;
  billingState: string | null;
  billingPostalCode: string | null;
  note: string | null;
};

export function CustomerForm({ action, customer }: { action: FormAction; customer?: Customer }) {
  return (
    <Form action={action} className="grid max-w-2xl gap-4">
      {customer && <input type="hidden" name="customerId" value={customer.id} />}
      <TextField label="Name" name="name" defaultValue={customer?.name} />
      <TextField label="Telephone" name="phone" type="tel" defaultValue={customer?.phone} />
      <TextField label="Billing street" name="billingStreet" defaultValue={customer?.billingStreet} />
      <div className="grid gap-4 sm:grid-cols-[1fr_6rem_8rem]">
        <TextField label="City" name="billingCity" defaultValue={customer?.billingCity} />
        <SelectField label="State" name="billingState" defaultValue={customer?.billingState ?? ""}>
          <option value="" />
          {US_STATES.map((state) => (
            <option key={state}>{state}</option>
          ))}
        </SelectField>
        <TextField label="Postal code" name="billingPostalCode" defaultValue={customer?.billingPostalCode} />
      </div>
      <TextareaField
        label="Internal note"
        name="note"
        defaultValue={customer?.note}
        hint="Only the office reads this: never the customer, never the crew."
      />
      <SubmitButton>{customer ? "Save" : "Add customer"}</SubmitButton>
    </Form>
  );
}

export function ContactForm({ action, customerId }: { action: FormAction; customerId: string }) {
  return (
    <Form action={action} className="grid max-w-2xl gap-4">
      <input type="hidden" name="customerId" value={customerId} />
      <input type="hidden" name="allSites" value="on" />
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField label="Name" name="name" />
        <TextField label="Title" name="title" />
        <TextField label="E-mail address" name="email" type="email" />
        <TextField label="Telephone" name="phone" type="tel" />
      </div>
      <SubmitButton variant="quiet">Add contact</SubmitButton>
    </Form>
  );
}
