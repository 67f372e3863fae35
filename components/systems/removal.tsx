import { TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";

type Props = {
  systemId: string;
  entry: "point" | "output" | "equipment";
  id: string;
  name: string;
  removedOn: string | null;
  today: string;
  actions: { remove: FormAction; putBack: FormAction };
};

/** Takes a thing off the list with the day on which it went, and puts it back. */
export function Removal({ systemId, entry, id, name, removedOn, today, actions }: Props) {
  const hidden = { systemId, entry, id };
  if (removedOn) {
    return (
      <Form action={actions.putBack} say="toast" className="relative inline-grid">
        {Object.entries(hidden).map(([key, value]) => (
          <input key={key} type="hidden" name={key} value={value} />
        ))}
        <SubmitButton variant="quiet" size="small">
          Put back<span className="sr-only"> {name}</span>
        </SubmitButton>
      </Form>
    );
  }
  return (
    <FormDialog
      action={actions.remove}
      button="Remove"
      aside={name}
      title={`Remove ${name}?`}
      description="It leaves the list and the script. What was proven of it stays, and it can be put back."
      submit="Remove"
      look="plain"
      hidden={hidden}
    >
      <TextField label="Gone since" name="removedOn" type="date" defaultValue={today} />
    </FormDialog>
  );
}
