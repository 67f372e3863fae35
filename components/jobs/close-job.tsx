import { TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { type JobState, mayBecome } from "@/lib/domain/jobs/job-state";

type Props = {
  jobId: string;
  state: JobState;
  today: string;
  isOccurrence: boolean;
  done: FormAction;
  cancel: FormAction;
};

/** The two ways in which a job ends here: it was done, or it will not be. */
export function CloseJob({ jobId, state, today, isOccurrence, done, cancel }: Props) {
  return (
    <div className="grid gap-5 sm:grid-cols-2">
      <Form action={done} className="grid content-start gap-3">
        <input type="hidden" name="jobId" value={jobId} />
        <TextField
          label="Done on"
          name="doneOn"
          type="date"
          defaultValue={today}
          hint={isOccurrence ? "The next window counts from this day" : undefined}
        />
        <SubmitButton variant="quiet" className="justify-self-start">
          Say that it is done
        </SubmitButton>
      </Form>
      {mayBecome(state, "canceled") ? (
        <Form action={cancel} className="grid content-start gap-3">
          <input type="hidden" name="jobId" value={jobId} />
          <TextField
            label="Why it is canceled"
            name="reason"
            hint={isOccurrence ? "The due list will show the occurrence again" : undefined}
          />
          <SubmitButton variant="danger" className="justify-self-start">
            Cancel the job
          </SubmitButton>
        </Form>
      ) : (
        <p className="text-muted">
          A job with visits is not canceled: cancel its visits first, so that all hear of it.
        </p>
      )}
    </div>
  );
}
