import { TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { RowAction } from "@/components/form/row-action";
import { DueBadge } from "@/components/layout/due-badge";
import { Facts } from "@/components/layout/page-header";
import { Card } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import type { DueState, DueWindow } from "@/lib/domain/agreements/due-window";
import { shortDate } from "@/lib/domain/agreements/due-words";
import { FREQUENCY_WORDS, TEST_KIND_WORDS } from "@/lib/domain/agreements/words";
import { moneyWords } from "@/lib/domain/shared/money";
import { paths } from "@/lib/domain/shared/paths";
import { FUNCTION_WORDS } from "@/lib/domain/systems/words";
import { type FormItem, ItemForm } from "./item-form";

type Item = FormItem & {
  endedAt: Date | null;
  site: { id: string; name: string; city: string };
  system: { name: string } | null;
  history: readonly { targetOn: string; doneOn: string }[];
  job: { id: string; number: number } | null;
  window: DueWindow;
  due: { state: DueState; daysLeft: number };
  reckoning: string;
  source: string | null;
};

type Actions = { change: FormAction; end: FormAction; complete: FormAction; makeJob: FormAction };
type Props = { item: Item; actions: Actions; mayChange: boolean; mayMakeJobs: boolean };

/** One kind of test of an agreement: its next window, how that was reckoned, and what was done before. */
export function AgreementItem({ item, actions, mayChange, mayMakeJobs }: Props) {
  const { window } = item;
  return (
    <Card className="grid gap-3">
      <div className="flex flex-wrap items-center justify-between gap-2">
        <h3 className="font-bold">
          {FREQUENCY_WORDS[item.frequency]}: {TEST_KIND_WORDS[item.testKind].toLowerCase()}
        </h3>
        {item.endedAt ? <p className="text-muted">Ended</p> : <DueBadge state={item.due.state} />}
      </div>
      <Facts
        rows={[
          [
            "Site",
            <span key="site">
              <TextLink href={paths.site(item.site.id)}>{item.site.name}</TextLink>, {item.site.city}
              {item.system && `, ${item.system.name}`}
            </span>,
          ],
          [
            "Operates",
            item.functions.map((one) => FUNCTION_WORDS[one]).join(", ") || "Nothing: it can be done at any hour",
          ],
          [
            "Next",
            <span key="next" className="figures">
              {shortDate(window.earliest)} to {shortDate(window.latest)}, target {shortDate(window.target)}
            </span>,
          ],
          [
            "Reckoned",
            <span key="reckoned">
              {item.reckoning}{" "}
              {item.source && (
                <a href={item.source} target="_blank" rel="noreferrer" className="underline">
                  Source
                </a>
              )}
            </span>,
          ],
          [
            "Each",
            <span key="each" className="figures">
              {moneyWords(item.priceCents)}, {item.visitMinutes} min, crew of {item.crewSize}
            </span>,
          ],
          [
            "Done",
            item.history.length > 0 ? (
              <span key="done" className="figures">
                {item.history
                  .slice(0, 5)
                  .map((one) => shortDate(one.doneOn))
                  .join(" · ")}
              </span>
            ) : (
              "Nothing recorded"
            ),
          ],
        ]}
      />
      {!item.endedAt && (
        <div className="flex flex-wrap items-end gap-3" data-print="off">
          {item.job ? (
            <TextLink href={paths.job(item.job.id)}>Job {item.job.number}</TextLink>
          ) : (
            mayMakeJobs && <RowAction action={actions.makeJob} name="itemId" value={item.id} button="Make the job" />
          )}
          {mayChange && (
            <RowAction
              action={actions.end}
              name="itemId"
              value={item.id}
              button="End this item"
              danger
              confirm={{
                title: "End this item?",
                description: "No further job is made for it. What is booked stays booked, what was done stays written.",
              }}
            />
          )}
        </div>
      )}
      {!item.endedAt && mayChange && (
        <>
          <details>
            <summary className="cursor-pointer font-semibold">Record that it was done</summary>
            <Form action={actions.complete} className="mt-3 flex flex-wrap items-end gap-3">
              <input type="hidden" name="itemId" value={item.id} />
              <TextField label="Done on" name="doneOn" type="date" />
              <SubmitButton variant="quiet">Record</SubmitButton>
            </Form>
          </details>
          <details>
            <summary className="cursor-pointer font-semibold">Change</summary>
            <div className="mt-3">
              <ItemForm action={actions.change} item={item} />
            </div>
          </details>
        </>
      )}
    </Card>
  );
}
