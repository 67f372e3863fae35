import { TextField } from "@/components/form/field";
import type { FormAction } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";
import { RowAction } from "@/components/form/row-action";
import { ShowCode } from "@/components/form/show-code";
import { Section } from "@/components/layout/page-header";
import { Card } from "@/components/ui/card";
import { KEY_KIND_WORDS, type KeyKind, SECRET_KIND_WORDS, type SecretKind } from "@/lib/domain/sites/words";
import { AddKey, AddSecret, AddStationAccount } from "./access-forms";
import { Call, Entries, Entry, Nothing } from "./entries";

type Actions = Record<
  "addKey" | "handOverKey" | "endKey" | "addSecret" | "endSecret" | "addStationAccount" | "endStationAccount",
  FormAction
>;
type Props = {
  siteId: string;
  accessNote: string | null;
  keys: readonly { id: string; kind: KeyKind; label: string; keptBy: string }[];
  secrets: readonly { id: string; kind: SecretKind; label: string }[];
  stationAccounts: readonly {
    id: string;
    station: string;
    phone: string;
    accountNumber: string;
    note: string | null;
  }[];
  mayChange: boolean;
  mayLook: boolean;
  actions: Actions;
};

/** How the crew gets in, and whom it tells before a test. */
export function AccessSection(props: Props) {
  return (
    <>
      <Section title="Access">
        {props.accessNote ? (
          <Card className="whitespace-pre-line">{props.accessNote}</Card>
        ) : (
          <Nothing>Nothing is written down about how to get in.</Nothing>
        )}
      </Section>
      <div className="grid min-w-0 grid-cols-1 items-start gap-5 lg:grid-cols-2">
        <Keys {...props} />
        {props.mayLook && <Codes {...props} />}
      </div>
      <Stations {...props} />
    </>
  );
}

const Keys = ({ siteId, keys, mayChange, actions }: Props) => (
  <Section title="Keys and badges" actions={mayChange && <AddKey siteId={siteId} action={actions.addKey} />}>
    {keys.length === 0 && <Nothing>None kept for this site.</Nothing>}
    {keys.length > 0 && (
      <Entries>
        {keys.map(({ id, kind, label, keptBy }) => (
          <Entry
            key={id}
            title={`${KEY_KIND_WORDS[kind]}: ${label}`}
            actions={
              mayChange && (
                <>
                  <FormDialog
                    action={actions.handOverKey}
                    button="Hand over"
                    aside={label}
                    title={`Hand over: ${label}`}
                    submit="Hand over"
                    hidden={{ keyId: id }}
                  >
                    <TextField label="Who has it now, or where it hangs" name="keptBy" />
                  </FormDialog>
                  <RowAction
                    action={actions.endKey}
                    name="keyId"
                    value={id}
                    button="End"
                    confirm={{ title: `${label} is no longer kept?`, description: "Given back, lost or void." }}
                  />
                </>
              )
            }
          >
            <p>{keptBy}</p>
          </Entry>
        ))}
      </Entries>
    )}
  </Section>
);

const Codes = ({ siteId, secrets, mayChange, actions }: Props) => (
  <Section
    title="Codes"
    note="Sealed, and shown to the office and to that day’s crew. Each look is written into the audit trail; a code hides after a minute."
    actions={mayChange && <AddSecret siteId={siteId} action={actions.addSecret} />}
  >
    {secrets.length === 0 && <Nothing>No code is kept.</Nothing>}
    {secrets.length > 0 && (
      <Entries>
        {secrets.map(({ id, kind, label }) => (
          <Entry
            key={id}
            title={label}
            actions={
              <>
                <ShowCode secretId={id} label={label} />
                {mayChange && (
                  <RowAction
                    action={actions.endSecret}
                    name="secretId"
                    value={id}
                    button="End"
                    confirm={{
                      title: `End the code ${label}?`,
                      description: "It is destroyed and cannot be read again.",
                    }}
                  />
                )}
              </>
            }
          >
            <p>{SECRET_KIND_WORDS[kind]}</p>
          </Entry>
        ))}
      </Entries>
    )}
  </Section>
);

const Stations = ({ siteId, stationAccounts, mayChange, actions }: Props) => (
  <Section
    title="Supervising station"
    actions={mayChange && <AddStationAccount siteId={siteId} action={actions.addStationAccount} />}
  >
    {stationAccounts.length === 0 && (
      <Nothing>No account is recorded. Without it nobody can be asked to put it on test.</Nothing>
    )}
    {stationAccounts.length > 0 && (
      <Entries>
        {stationAccounts.map(({ id, station, phone, accountNumber, note }) => (
          <Entry
            key={id}
            title={station}
            actions={
              mayChange && (
                <RowAction
                  action={actions.endStationAccount}
                  name="stationAccountId"
                  value={id}
                  button="End"
                  confirm={{ title: `End the account at ${station}?`, description: "It stays in the audit trail." }}
                />
              )
            }
          >
            <p>
              Account <span className="figures text-text">{accountNumber}</span> <Call phone={phone} />
            </p>
            {note && <p>{note}</p>}
          </Entry>
        ))}
      </Entries>
    )}
  </Section>
);
