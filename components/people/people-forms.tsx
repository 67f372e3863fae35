"use client";

import { SelectField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { ROLE_WORDS, STAFF_ROLES } from "@/lib/domain/shared/roles";

const RoleOptions = () =>
  STAFF_ROLES.map((role) => (
    <option key={role} value={role}>
      {ROLE_WORDS[role]}
    </option>
  ));

export function InviteForm({ action }: { action: FormAction }) {
  return (
    <Form action={action} className="grid max-w-xl gap-4">
      <TextField label="Name" name="name" />
      <TextField
        label="E-mail address"
        name="email"
        type="email"
        hint="The invitation goes there and works for 14 days."
      />
      <TextField label="Telephone" name="phone" type="tel" />
      <SelectField label="Role" name="role" defaultValue="technician">
        <RoleOptions />
      </SelectField>
      <SubmitButton>Send invitation</SubmitButton>
    </Form>
  );
}

export function RoleForm({ action, memberId, role }: { action: FormAction; memberId: string; role: string }) {
  return (
    <Form action={action} className="flex flex-wrap items-end gap-3">
      <input type="hidden" name="memberId" value={memberId} />
      <SelectField label="Role" name="role" defaultValue={role}>
        <RoleOptions />
      </SelectField>
      <SubmitButton variant="quiet">Change role</SubmitButton>
    </Form>
  );
}

export function LicenseForm({ action, memberId }: { action: FormAction; memberId: string }) {
  return (
    <Form action={action} className="grid max-w-2xl gap-4 sm:grid-cols-2">
      <input type="hidden" name="memberId" value={memberId} />
      <TextField label="Kind" name="kind" defaultValue="Fire alarm technician" />
      <TextField label="Number" name="number" />
      <TextField label="Jurisdiction" name="jurisdiction" />
      <TextField label="Last day" name="expiresOn" type="date" />
      <SubmitButton variant="quiet" className="sm:col-span-2">
        Record license
      </SubmitButton>
    </Form>
  );
}
