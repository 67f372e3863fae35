"use client";

import { useRef } from "react";
import { TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { Button } from "@/components/ui/button";
import { Card } from "@/components/ui/card";
import { ROLE_WORDS, type Role } from "@/lib/domain/shared/roles";

type DemoAccount = { role: Role; email: string; password: string };

export function PasswordForm({ action, next, demo }: { action: FormAction; next: string; demo: DemoAccount[] }) {
  const fields = useRef<HTMLDivElement>(null);
  const fill = ({ email, password }: DemoAccount) => {
    for (const [name, value] of Object.entries({ email, password })) {
      const input = fields.current?.querySelector<HTMLInputElement>(`[name=${name}]`);
      if (input) input.value = value;
    }
  };
  return (
    <>
      <Form action={action} className="grid gap-4">
        <input type="hidden" name="next" value={next} />
        <div ref={fields} className="grid gap-4">
          <TextField label="E-mail address" name="email" type="email" autoComplete="username" />
          <TextField label="Password" name="password" type="password" autoComplete="current-password" />
        </div>
        <SubmitButton size="thumb">Sign in</SubmitButton>
      </Form>
      {demo.length > 0 && (
        <Card aria-label="Demo accounts" className="grid grid-cols-[minmax(0,1fr)] gap-2">
          <h2 className="font-semibold">Demo accounts</h2>
          <p className="text-sm text-muted">
            All with the password <span className="figures">{demo[0]?.password}</span>. Choose one to fill the form.
          </p>
          <ul className="grid grid-cols-[minmax(0,1fr)] gap-1">
            {demo.map((account) => (
              <li key={account.role}>
                <Button
                  className="w-full justify-between max-sm:flex-col max-sm:items-start max-sm:gap-0"
                  size="small"
                  onClick={() => fill(account)}
                >
                  <span>{ROLE_WORDS[account.role]}</span>
                  <span className="figures min-w-0 font-normal break-all">{account.email}</span>
                </Button>
              </li>
            ))}
          </ul>
        </Card>
      )}
    </>
  );
}

export function LinkForm({ action, next }: { action: FormAction; next: string }) {
  return (
    <details className="rounded-lg border border-line bg-surface p-4">
      <summary className="cursor-pointer font-semibold">Sign in by a link instead</summary>
      <Form action={action} className="mt-3 grid gap-3">
        <input type="hidden" name="next" value={next} />
        <TextField label="Where should the link go?" name="email" type="email" autoComplete="email" />
        <SubmitButton variant="quiet">Send me a link</SubmitButton>
      </Form>
    </details>
  );
}

export function ForgotForm({ action }: { action: FormAction }) {
  return (
    <Form action={action} className="grid gap-4">
      <TextField label="E-mail address" name="email" type="email" autoComplete="email" />
      <SubmitButton size="thumb">Send me a letter</SubmitButton>
    </Form>
  );
}

export function NewPasswordForm({ action, token, button }: { action: FormAction; token: string; button: string }) {
  return (
    <Form action={action} className="grid gap-4">
      <input type="hidden" name="token" value={token} />
      <TextField
        label="Password"
        name="password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters. A sentence is easier to keep than a riddle."
      />
      <SubmitButton size="thumb">{button}</SubmitButton>
    </Form>
  );
}
