"use client";

import { TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";

export function ChangePasswordForm({ action }: { action: FormAction }) {
  return (
    <Form action={action} className="grid gap-4">
      <TextField label="Present password" name="currentPassword" type="password" autoComplete="current-password" />
      <TextField
        label="New password"
        name="password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters. You are signed out everywhere and sign in with it."
      />
      <SubmitButton size="thumb">Change password</SubmitButton>
    </Form>
  );
}
