import { SelectField, TextareaField, TextField } from "@/components/form/field";
import type { FormAction } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";
import {
  DOCUMENT_KIND_WORDS,
  DOCUMENT_KINDS,
  KEY_KIND_WORDS,
  KEY_KINDS,
  SECRET_KIND_WORDS,
  SECRET_KINDS,
} from "@/lib/domain/sites/words";

type Props = { siteId: string; action: FormAction };

function Kinds<K extends string>({ kinds, words }: { kinds: readonly K[]; words: Record<K, string> }) {
  return (
    <SelectField label="Kind" name="kind" defaultValue={kinds[0]}>
      {kinds.map((kind) => (
        <option key={kind} value={kind}>
          {words[kind]}
        </option>
      ))}
    </SelectField>
  );
}

export const AddKey = ({ siteId, action }: Props) => (
  <FormDialog action={action} button="Add key" title="A key, badge or fob" submit="Add" hidden={{ siteId }}>
    <Kinds kinds={KEY_KINDS} words={KEY_KIND_WORDS} />
    <TextField label="What it opens" name="label" />
    <TextField label="Who has it, or where it hangs" name="keptBy" />
  </FormDialog>
);

export const AddSecret = ({ siteId, action }: Props) => (
  <FormDialog
    action={action}
    button="Add code"
    title="A code for the crew"
    description="It is sealed at once. Nobody finds it by search, in exports or in the audit trail."
    submit="Keep code"
    hidden={{ siteId }}
  >
    <Kinds kinds={SECRET_KINDS} words={SECRET_KIND_WORDS} />
    <TextField label="What it is for" name="label" hint="Without the code itself" />
    <TextField label="Code" name="secret" autoComplete="off" />
  </FormDialog>
);

export const AddStationAccount = ({ siteId, action }: Props) => (
  <FormDialog
    action={action}
    button="Add account"
    title="Account at a supervising station"
    submit="Add account"
    hidden={{ siteId }}
  >
    <TextField label="Station" name="station" />
    <TextField label="Telephone" name="phone" type="tel" />
    <TextField label="Account number" name="accountNumber" />
    <TextareaField label="Note" name="note" optional hint="Not the passcode: that is a code" />
  </FormDialog>
);

export const AddDocument = ({ siteId, action }: Props) => (
  <FormDialog
    action={action}
    button="Add document"
    title="A paper and where it is kept"
    submit="Add document"
    hidden={{ siteId }}
  >
    <Kinds kinds={DOCUMENT_KINDS} words={DOCUMENT_KIND_WORDS} />
    <TextField label="Title" name="title" />
    <TextField label="Dated" name="dated" type="date" optional />
    <TextField label="Where it is kept" name="keptWhere" hint="Cabinet, binder, drawer, address of a folder" />
  </FormDialog>
);
