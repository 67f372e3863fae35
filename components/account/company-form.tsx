"use client";

import { SelectField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { US_STATES } from "@/lib/domain/shared/inputs";

type Company = Record<"name" | "phone" | "street" | "city" | "state" | "postalCode" | "zone", string>;

export function CompanyForm({
  action,
  company,
  zones,
}: {
  action: FormAction;
  company: Company;
  zones: readonly string[];
}) {
  return (
    <Form action={action} className="grid max-w-2xl gap-4">
      <TextField label="Name" name="name" defaultValue={company.name} />
      <TextField label="Telephone" name="phone" type="tel" defaultValue={company.phone} />
      <TextField label="Street" name="street" defaultValue={company.street} />
      <div className="grid gap-4 sm:grid-cols-[1fr_6rem_8rem]">
        <TextField label="City" name="city" defaultValue={company.city} />
        <SelectField label="State" name="state" defaultValue={company.state}>
          {US_STATES.map((state) => (
            <option key={state}>{state}</option>
          ))}
        </SelectField>
        <TextField label="Postal code" name="postalCode" defaultValue={company.postalCode} />
      </div>
      <SelectField label="Time zone" name="zone" defaultValue={company.zone}>
        {zones.map((zone) => (
          <option key={zone}>{zone}</option>
        ))}
      </SelectField>
      <SubmitButton>Save</SubmitButton>
    </Form>
  );
}
