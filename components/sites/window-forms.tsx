import { SelectField, TextareaField, TextField } from "@/components/form/field";
import type { FormAction } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";
import { Checkbox, Choice, ChoiceGroup } from "@/components/ui/choice";
import { WEEKDAYS } from "@/lib/domain/windows/words";
import { FunctionsChoice } from "./functions-choice";

type Props = { siteId: string; action: FormAction };

export const AddWindow = ({ siteId, action }: Props) => (
  <FormDialog
    action={action}
    button="Add window"
    title="When the site lets functions operate"
    submit="Add window"
    hidden={{ siteId }}
  >
    <FunctionsChoice legend="Functions that may operate then" />
    <ChoiceGroup legend="Begins on" className="grid-cols-4 sm:grid-cols-7">
      {WEEKDAYS.map((word, i) => (
        <Choice key={word}>
          <Checkbox name="weekdays[]" value={i + 1} />
          {word}
        </Choice>
      ))}
    </ChoiceGroup>
    <TextField label="Or on one date alone" name="onDate" type="date" optional />
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField label="From" name="startsLocal" type="time" />
      <TextField label="To" name="endsLocal" type="time" hint="At or before “From”: the next day" />
    </div>
    <div className="grid gap-4 sm:grid-cols-3">
      <TextField label="First day" name="fromDate" type="date" optional />
      <TextField label="Last day" name="toDate" type="date" optional />
      <TextField label="Hours’ notice" name="noticeHours" inputMode="numeric" defaultValue="0" />
    </div>
    <TextareaField label="Note" name="note" optional />
  </FormDialog>
);

export const AddNoTest = ({ siteId, action }: Props) => (
  <FormDialog
    action={action}
    button="Add dates"
    title="When functions must never operate"
    submit="Add dates"
    hidden={{ siteId }}
  >
    <FunctionsChoice legend="Functions" />
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField label="First day" name="fromDate" type="date" />
      <TextField label="Last day" name="toDate" type="date" />
    </div>
    <TextField label="Reason" name="reason" hint="Exams, holidays, an event" />
  </FormDialog>
);

export const AddAttendance = ({
  siteId,
  action,
  contacts,
}: Props & { contacts: readonly { id: string; name: string }[] }) => (
  <FormDialog
    action={action}
    button="Add"
    aside="who must attend"
    title="Who must stand by"
    submit="Add"
    hidden={{ siteId }}
  >
    <FunctionsChoice legend="While these functions operate" />
    <TextField label="Who" name="party" hint="In the building’s words: building engineer, elevator contractor" />
    <SelectField label="Contact" name="contactId" optional defaultValue="">
      <option value="">Nobody recorded here</option>
      {contacts.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </SelectField>
    <TextField label="Telephone" name="phone" type="tel" optional />
  </FormDialog>
);
