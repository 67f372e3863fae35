import { SelectField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { RowAction } from "@/components/form/row-action";
import { Badge } from "@/components/ui/badge";
import { WAITS_FOR, WAITS_FOR_WORDS, type WaitsFor } from "@/lib/domain/jobs/words";
import { calendarDate } from "@/lib/domain/shared/zone";

type Wait = {
  id: string;
  waitsFor: WaitsFor;
  person: string;
  untilDate: string | null;
  note: string | null;
  since: Date;
  endedAt: Date | null;
};
type Props = {
  jobId: string;
  waits: readonly Wait[];
  zone: string;
  today: string;
  actions?: { wait: FormAction; endWait: FormAction };
};

/** What the job waits for: since when, from whom, until when. */
export function JobWaits({ jobId, waits, zone, today, actions }: Props) {
  return (
    <div className="grid gap-3">
      {waits.length === 0 && <p className="text-muted">Nothing.</p>}
      <ul className="grid gap-2">
        {waits.map((wait) => (
          <li key={wait.id} className="flex flex-wrap items-center justify-between gap-2">
            <span className={wait.endedAt ? "text-muted" : undefined}>
              <span className="font-semibold">For {WAITS_FOR_WORDS[wait.waitsFor]}</span>, from {wait.person}, since{" "}
              <span className="figures">{calendarDate(wait.since, zone)}</span>
              {wait.untilDate && (
                <>
                  , until <span className="figures">{wait.untilDate}</span>
                </>
              )}
              {wait.endedAt && (
                <>
                  , ended <span className="figures">{calendarDate(wait.endedAt, zone)}</span>
                </>
              )}
              {wait.note && <span className="block text-sm text-muted">{wait.note}</span>}
            </span>
            {!wait.endedAt && wait.untilDate && wait.untilDate < today && <Badge tone="alert">Past its date</Badge>}
            {!wait.endedAt && actions && (
              <RowAction action={actions.endWait} name="waitId" value={wait.id} button="It has come" />
            )}
          </li>
        ))}
      </ul>
      {actions && (
        <details>
          <summary className="cursor-pointer font-semibold">Wait for something</summary>
          <Form action={actions.wait} className="mt-3 grid max-w-2xl gap-4 sm:grid-cols-2">
            <input type="hidden" name="jobId" value={jobId} />
            <SelectField label="For" name="waitsFor" defaultValue="parts">
              {WAITS_FOR.map((one) => (
                <option key={one} value={one}>
                  {WAITS_FOR_WORDS[one]}
                </option>
              ))}
            </SelectField>
            <TextField label="From whom" name="person" hint="Who delivers, opens or approves" />
            <TextField label="Until" name="untilDate" type="date" optional />
            <TextField label="Note" name="note" optional />
            <SubmitButton variant="quiet" className="justify-self-start">
              Wait
            </SubmitButton>
          </Form>
        </details>
      )}
    </div>
  );
}
