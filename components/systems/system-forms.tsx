import { TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";

type System = {
  id: string;
  key: string;
  name: string;
  maker: string | null;
  model: string | null;
  location: string | null;
};

const SystemFields = ({ system }: { system?: System }) => (
  <>
    <TextField label="Name" name="name" defaultValue={system?.name} hint="As people there call it: Main panel, tower" />
    <TextField
      label="Key"
      name="key"
      defaultValue={system?.key}
      hint="What lists call it, the same at every import: FACU-1"
    />
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField label="Maker" name="maker" optional defaultValue={system?.maker} />
      <TextField label="Model" name="model" optional defaultValue={system?.model} />
    </div>
    <TextField label="Where the panel hangs" name="location" optional defaultValue={system?.location} />
  </>
);

export const NewSystemForm = ({ action, siteId }: { action: FormAction; siteId: string }) => (
  <Form action={action} className="grid max-w-2xl gap-4">
    <input type="hidden" name="siteId" value={siteId} />
    <SystemFields />
    <SubmitButton>Add system</SubmitButton>
  </Form>
);

export const EditSystem = ({ action, system }: { action: FormAction; system: System }) => (
  <FormDialog action={action} button="Edit" title="Edit system" submit="Save" hidden={{ systemId: system.id }}>
    <SystemFields system={system} />
  </FormDialog>
);
