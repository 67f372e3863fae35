"use server";

import { paths } from "@/lib/domain/shared/paths";
import { addContact } from "@/lib/services/customers/add-contact";
import { createCustomer } from "@/lib/services/customers/create-customer";
import { endContact } from "@/lib/services/customers/end-contact";
import { inviteContact } from "@/lib/services/customers/invite-contact";
import { updateCustomer } from "@/lib/services/customers/update-customer";
import { action } from "@/lib/web/action";

export const createCustomerAction = action(createCustomer, { to: ({ customerId }) => paths.customer(customerId) });
export const updateCustomerAction = action(updateCustomer, { done: "Customer saved" });
export const addContactAction = action(addContact, { done: "Contact added" });
export const endContactAction = action(endContact, { done: "Contact ended" });
export const inviteContactAction = action(inviteContact, { done: "Invitation sent" });
