"use client";

import { CheckboxField, RadioField, SelectField, TextareaField, TextField } from "@/components/form/field";
import { Form, SubmitButton } from "@/components/form/form";
import { FormStateContext } from "@/components/form/form-context";
import { Input } from "@/components/ui/input";
import { Group } from "./group";

const REFUSED = {
  ok: false,
  message: "Some entries need another look",
  fieldErrors: {
    name: ["Name is missing"],
    kind: ["Choose a kind"],
    note: ["That is too long"],
    agreed: ["Agree first"],
  },
};

export function Fields({ theme }: { theme: string }) {
  return (
    <>
      <Group title="Controls">
        <Input aria-label="Empty" placeholder="Empty" className="w-40" />
        <Input aria-label="Filled" defaultValue="Filled" className="w-40" />
        <Input aria-label="Read only" defaultValue="Read only" readOnly className="w-40" />
        <Input aria-label="Disabled" defaultValue="Disabled" disabled className="w-40" />
      </Group>
      <Group title="A form at rest">
        <Form action={async (state) => state} className="grid w-full gap-4">
          <SampleFields theme={`${theme}-rest`} />
          <SubmitButton>Save</SubmitButton>
        </Form>
      </Group>
      <Group title="The same, refused">
        <FormStateContext value={REFUSED}>
          <div className="grid w-full gap-4">
            <SampleFields theme={`${theme}-refused`} />
          </div>
        </FormStateContext>
      </Group>
    </>
  );
}

function SampleFields({ theme }: { theme: string }) {
  return (
    <>
      <TextField label="Name" name="name" hint="As it stands on the door" />
      <SelectField label="Kind" name="kind" optional>
        <option value="">Choose</option>
        <option>Fan</option>
      </SelectField>
      <TextareaField label="Note" name="note" />
      <CheckboxField label="Agreed" name="agreed" />
      <CheckboxField label="Tell me" name="tell" as="switch" defaultChecked />
      <RadioField
        label="When"
        name={`when-${theme}`}
        defaultValue="night"
        options={[
          { value: "day", label: "By day" },
          { value: "night", label: "At night", hint: "When the building can live without its fans" },
        ]}
      />
    </>
  );
}
