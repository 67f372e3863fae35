"use client";

import { useState } from "react";
import { CheckboxField, SelectField, TextareaField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { FunctionsField } from "@/components/form/functions-field";
import { JOB_KIND_WORDS, JOB_KINDS, type JobKind } from "@/lib/domain/jobs/words";
import type { SystemFunction } from "@/lib/domain/systems/words";

type Job = {
  id: string;
  kind: JobKind;
  title: string;
  systemId: string | null;
  details: string | null;
  urgent: boolean;
  callerName: string | null;
  callerPhone: string | null;
  functions: SystemFunction[];
  visitMinutes: number;
  crewSize: number;
  systems: readonly { id: string; name: string }[];
};

export function JobForm({ action, job }: { action: FormAction; job: Job }) {
  const [functions, setFunctions] = useState(job.functions);
  return (
    <Form action={action} className="grid max-w-3xl gap-4">
      <input type="hidden" name="jobId" value={job.id} />
      <TextField label="What is to be done" name="title" defaultValue={job.title} />
      <TextareaField label="In more words" name="details" optional defaultValue={job.details} />
      <div className="grid gap-4 sm:grid-cols-2">
        <SelectField label="Kind" name="kind" defaultValue={job.kind}>
          {JOB_KINDS.map((kind) => (
            <option key={kind} value={kind}>
              {JOB_KIND_WORDS[kind]}
            </option>
          ))}
        </SelectField>
        <SelectField label="System" name="systemId" defaultValue={job.systemId ?? ""}>
          <option value="">The whole site</option>
          {job.systems.map((system) => (
            <option key={system.id} value={system.id}>
              {system.name}
            </option>
          ))}
        </SelectField>
        <TextField label="Who called" name="callerName" optional defaultValue={job.callerName} />
        <TextField label="Telephone" name="callerPhone" type="tel" optional defaultValue={job.callerPhone} />
        <TextField
          label="Minutes on site"
          name="visitMinutes"
          inputMode="numeric"
          defaultValue={String(job.visitMinutes)}
        />
        <TextField label="People" name="crewSize" inputMode="numeric" defaultValue={String(job.crewSize)} />
      </div>
      <FunctionsField
        legend="What really operates"
        hint="The live part of a visit must lie in a test window for each of these."
        value={functions}
        onChange={setFunctions}
      />
      <CheckboxField label="Urgent" name="urgent" as="switch" defaultChecked={job.urgent} />
      <SubmitButton className="justify-self-start">Save</SubmitButton>
    </Form>
  );
}
