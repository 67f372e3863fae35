import { SelectField, TextField } from "@/components/form/field";
import type { FormAction } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";
import { Section } from "@/components/layout/page-header";
import { TextLink } from "@/components/ui/text-link";
import { grouped } from "@/lib/domain/shared/grouped";
import { paths } from "@/lib/domain/shared/paths";
import { HOLDER_CAPACITIES, HOLDER_CAPACITY_WORDS, type HolderCapacity } from "@/lib/domain/sites/words";
import { Call, Entries, Entry, Nothing } from "./entries";

type Holder = {
  holder: { id: string; capacity: HolderCapacity; fromDate: string; toDate: string | null };
  customer: { id: string; name: string; phone: string | null };
};
type Contact = {
  id: string;
  customerId: string;
  name: string;
  title: string | null;
  phone: string | null;
  email: string | null;
  since: Date;
};

type Props = {
  siteId: string;
  today: string;
  holders: readonly Holder[];
  contacts: readonly Contact[];
  customers: readonly { id: string; name: string }[];
  mayChange: boolean;
  actions: { add: FormAction; end: FormAction };
};

/** Who holds the site in which capacity from when to when, and who speaks for them. */
export function PeopleSection({ siteId, today, holders, contacts, customers, mayChange, actions }: Props) {
  const byCustomer = grouped(contacts, ({ customerId }) => customerId);
  const held = grouped(holders, ({ customer }) => customer.id);
  return (
    <Section
      title="People"
      note="Access to the site’s pages ends with the last day; what was done stays."
      actions={mayChange && <AddHolder {...{ siteId, today, customers }} action={actions.add} />}
    >
      {holders.length === 0 && (
        <Nothing>Nobody holds this site yet, so nobody can be billed for it. Add a holder.</Nothing>
      )}
      {[...held].map(([customerId, rows]) => (
        <Entries key={customerId}>
          {rows.map(({ holder, customer }) => (
            <Entry
              key={holder.id}
              title={<TextLink href={paths.customer(customer.id)}>{customer.name}</TextLink>}
              actions={
                mayChange &&
                !holder.toDate && (
                  <FormDialog
                    action={actions.end}
                    button="End"
                    aside={`${HOLDER_CAPACITY_WORDS[holder.capacity]}, ${customer.name}`}
                    title={`${customer.name} ends as ${HOLDER_CAPACITY_WORDS[holder.capacity].toLowerCase()}`}
                    submit="Record the last day"
                    look="plain"
                    hidden={{ holderId: holder.id }}
                  >
                    <TextField label="Last day" name="toDate" type="date" defaultValue={today} />
                  </FormDialog>
                )
              }
            >
              <p>
                {HOLDER_CAPACITY_WORDS[holder.capacity]}, from <span className="figures">{holder.fromDate}</span>
                {holder.toDate && (
                  <>
                    {" "}
                    to <span className="figures">{holder.toDate}</span>
                  </>
                )}{" "}
                <Call phone={customer.phone} />
              </p>
            </Entry>
          ))}
          {(byCustomer.get(customerId) ?? []).map((contact) => (
            <Entry key={contact.id} title={contact.name}>
              <p>
                {[contact.title, `contact since ${contact.since.toISOString().slice(0, 10)}`]
                  .filter(Boolean)
                  .join(", ")}
              </p>
              <p className="flex flex-wrap gap-x-4">
                <Call phone={contact.phone} />
                {contact.email && (
                  <a href={`mailto:${contact.email}`} className="underline">
                    {contact.email}
                  </a>
                )}
              </p>
            </Entry>
          ))}
        </Entries>
      ))}
    </Section>
  );
}

type AddProps = Pick<Props, "siteId" | "today" | "customers"> & { action: FormAction };

const AddHolder = ({ siteId, today, customers, action }: AddProps) => (
  <FormDialog
    action={action}
    button="Add holder"
    title="Who holds the site"
    submit="Add holder"
    hidden={{ siteId }}
    description="Contacts are added on the customer’s page."
  >
    <SelectField label="Customer" name="customerId" defaultValue="">
      <option value="">Choose</option>
      {customers.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </SelectField>
    <SelectField label="Capacity" name="capacity" defaultValue="owner">
      {HOLDER_CAPACITIES.map((capacity) => (
        <option key={capacity} value={capacity}>
          {HOLDER_CAPACITY_WORDS[capacity]}
        </option>
      ))}
    </SelectField>
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField label="First day" name="fromDate" type="date" defaultValue={today} />
      <TextField label="Last day" name="toDate" type="date" optional />
    </div>
  </FormDialog>
);
