"use client";

import { useState } from "react";
import { CheckboxField, SelectField, TextareaField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { type SiteChoice, SiteField } from "@/components/form/site-field";
import { Button } from "@/components/ui/button";
import { JOB_KIND_WORDS, JOB_KINDS } from "@/lib/domain/jobs/words";
import { SiteAtHand } from "./site-at-hand";

/** A call by telephone becomes a job: the site by a few letters, who calls, what is wrong, Enter. */
export function CallForm({ action, site: given }: { action: FormAction; site: SiteChoice | null }) {
  const [site, setSite] = useState<SiteChoice | null>(given);
  const [caller, setCaller] = useState({ name: "", phone: "" });
  const change = (field: keyof typeof caller) => (event: React.ChangeEvent<HTMLInputElement>) =>
    setCaller({ ...caller, [field]: event.target.value });
  return (
    <div className="grid gap-5 lg:grid-cols-[3fr_2fr]">
      <Form action={action} className="grid content-start gap-4">
        <SiteField chosen={site} onChoose={setSite} autoFocus={!given} />
        <TextField
          label="What is wrong"
          name="title"
          autoFocus={given !== null}
          autoComplete="off"
          hint="In a line, as it is said: trouble on the panel, horn does not stop"
        />
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField
            label="Who calls"
            name="callerName"
            optional
            autoComplete="off"
            value={caller.name}
            onChange={change("name")}
          />
          <TextField
            label="Telephone"
            name="callerPhone"
            type="tel"
            optional
            autoComplete="off"
            value={caller.phone}
            onChange={change("phone")}
          />
        </div>
        <CheckboxField label="Urgent" name="urgent" as="switch" hint="Marked on every list and on its page" />
        <TextareaField label="In more words" name="details" optional />
        <div className="grid gap-4 sm:grid-cols-2">
          <SelectField label="Kind" name="kind" defaultValue="service_call">
            {JOB_KINDS.map((kind) => (
              <option key={kind} value={kind}>
                {JOB_KIND_WORDS[kind]}
              </option>
            ))}
          </SelectField>
          {site && site.systems.length > 0 && (
            <SelectField label="System" name="systemId" defaultValue="">
              <option value="">Not known</option>
              {site.systems.map((system) => (
                <option key={system.id} value={system.id}>
                  {system.name}
                </option>
              ))}
            </SelectField>
          )}
        </div>
        <div className="flex flex-wrap gap-2">
          <SubmitButton className="justify-self-start">Make the job</SubmitButton>
        </div>
      </Form>
      <SiteAtHand site={site}>
        {(contact) => (
          <Button size="small" onClick={() => setCaller({ name: contact.name, phone: contact.phone ?? "" })}>
            This is who calls
          </Button>
        )}
      </SiteAtHand>
    </div>
  );
}
