import type { Metadata } from "next";
import { frame, may } from "@/app/frame";
import { AgreementForm } from "@/components/agreements/agreement-form";
import { AgreementItem } from "@/components/agreements/agreement-item";
import { ItemForm } from "@/components/agreements/item-form";
import { TextField } from "@/components/form/field";
import { Form, SubmitButton } from "@/components/form/form";
import { Facts, PageHeader, Section } from "@/components/layout/page-header";
import { Card, EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { paths } from "@/lib/domain/shared/paths";
import { calendarDate } from "@/lib/domain/shared/zone";
import { getAgreement } from "@/lib/services/agreements/get-agreement";
import { read } from "@/lib/web/page";
import { makeDueAction } from "../../due-list/actions";
import {
  addItemAction,
  changeItemAction,
  endAgreementAction,
  endItemAction,
  recordCompletionAction,
  updateAgreementAction,
} from "../actions";

export const metadata: Metadata = { title: "Agreement" };

const ITEM_ACTIONS = {
  change: changeItemAction,
  end: endItemAction,
  complete: recordCompletionAction,
  makeJob: makeDueAction,
};

export default async function AgreementPage({ params }: PageProps<"/agreements/[agreementId]">) {
  const agreement = await read(getAgreement, await params);
  const { company } = await frame();
  const mayChange = await may("agreement:write");
  const mayMakeJobs = await may("job:write");
  const today = calendarDate(new Date(), company.zone);
  const ended = agreement.endsOn !== null && agreement.endsOn < today;
  return (
    <>
      <PageHeader
        title={agreement.name}
        trail={[{ href: paths.agreements, label: "Agreements" }]}
        note={`Agreement ${agreement.number}${ended ? ", ended" : ""}`}
      />
      <Card>
        <Facts
          rows={[
            [
              "Customer",
              <TextLink key="customer" href={paths.customer(agreement.customer.id)}>
                {agreement.customer.name}
              </TextLink>,
            ],
            [
              "In force",
              <span key="dates" className="figures">
                {agreement.startsOn} to {agreement.endsOn ?? "no last day"}
              </span>,
            ],
            [
              "Purchase order",
              agreement.purchaseOrder ?? (agreement.purchaseOrderNeeded ? "Needed for each job" : "None needed"),
            ],
          ]}
        />
      </Card>
      <Section title="Tests">
        {agreement.items.length === 0 && (
          <EmptyState title="Nothing agreed yet">Add a kind of test below; its first window shows at once.</EmptyState>
        )}
        {agreement.items.map((item) => (
          <AgreementItem
            key={item.id}
            item={item}
            actions={ITEM_ACTIONS}
            mayChange={mayChange}
            mayMakeJobs={mayMakeJobs && !ended}
          />
        ))}
      </Section>
      {mayChange && (
        <>
          <Section title="Add a test">
            <ItemForm action={addItemAction} agreementId={agreement.id} sites={agreement.sites} />
          </Section>
          <Section title="Change">
            <AgreementForm action={updateAgreementAction} agreement={agreement} today={today} />
          </Section>
          <Section title="End" note="No job is made for a window that opens later.">
            <Form action={endAgreementAction} className="flex flex-wrap items-end gap-3">
              <input type="hidden" name="agreementId" value={agreement.id} />
              <TextField label="Last day" name="endsOn" type="date" defaultValue={agreement.endsOn ?? today} />
              <SubmitButton variant="danger">End the agreement</SubmitButton>
            </Form>
          </Section>
        </>
      )}
    </>
  );
}
