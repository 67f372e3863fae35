import type { Metadata } from "next";
import { cache } from "react";
import { may } from "@/app/frame";
import { ContactForm, CustomerForm } from "@/components/customers/customer-form";
import { RowAction } from "@/components/form/row-action";
import { PageHeader, Section } from "@/components/layout/page-header";
import { Card, EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { paths } from "@/lib/domain/shared/paths";
import { HOLDER_CAPACITY_WORDS } from "@/lib/domain/sites/words";
import { getCustomer } from "@/lib/services/customers/get-customer";
import { read } from "@/lib/web/page";
import { addContactAction, endContactAction, inviteContactAction, updateCustomerAction } from "../actions";

/** Asked once for the title and the page. */
const customerOf = cache((customerId: string) => read(getCustomer, { customerId }));

type Props = PageProps<"/customers/[customerId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await customerOf((await params).customerId)).name };
}

export default async function CustomerPage({ params }: Props) {
  const customer = await customerOf((await params).customerId);
  const mayWrite = await may("customer:write");
  const mayInvite = await may("person:write");
  return (
    <>
      <PageHeader trail={[{ href: paths.customers, label: "Customers" }]} title={customer.name} note={customer.phone} />
      <Section title="Contacts">
        {customer.contacts.length === 0 && <EmptyState title="No contact yet" />}
        {customer.contacts.map(({ contact, memberId }) => (
          <Card key={contact.id} className="flex flex-wrap items-center justify-between gap-2 p-3 sm:p-3">
            <div>
              <p className="font-semibold">{contact.name}</p>
              <p className="text-sm text-muted">{contact.title}</p>
              <p className="figures text-sm">{[contact.phone, contact.email].filter(Boolean).join(" · ")}</p>
            </div>
            {contact.endedAt ? (
              <p className="text-muted">Ended</p>
            ) : (
              <div className="flex flex-wrap gap-2">
                {memberId ? (
                  <p className="self-center text-sm text-muted">Can sign in</p>
                ) : (
                  mayInvite &&
                  contact.email && (
                    <RowAction action={inviteContactAction} name="contactId" value={contact.id} button="Invite" />
                  )
                )}
                {mayWrite && (
                  <RowAction
                    action={endContactAction}
                    name="contactId"
                    value={contact.id}
                    button="End"
                    danger
                    confirm={{
                      title: `End ${contact.name}?`,
                      description:
                        "From now on this person sees nothing of this customer. What they did stays on record.",
                    }}
                  />
                )}
              </div>
            )}
          </Card>
        ))}
        {mayWrite && <ContactForm action={addContactAction} customerId={customer.id} />}
      </Section>
      <Section title="Sites">
        {customer.holdings.length === 0 && <EmptyState title="No site yet">Say on a site who holds it.</EmptyState>}
        <ul className="grid gap-1">
          {customer.holdings.map(({ holder, site }) => (
            <li key={holder.id}>
              <TextLink href={paths.site(site.id)}>{site.name}</TextLink>, {HOLDER_CAPACITY_WORDS[holder.capacity]}
            </li>
          ))}
        </ul>
      </Section>
      {mayWrite && (
        <Section title="Change">
          <CustomerForm action={updateCustomerAction} customer={customer} />
        </Section>
      )}
    </>
  );
}
