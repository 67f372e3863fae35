import type { Metadata } from "next";
import { only } from "@/app/frame";
import { CustomerForm } from "@/components/customers/customer-form";
import { PageHeader } from "@/components/layout/page-header";
import { createCustomerAction } from "../actions";

export const metadata: Metadata = { title: "New customer" };

export default async function NewCustomerPage() {
  await only("customer:write");
  return (
    <>
      <PageHeader title="New customer" />
      <CustomerForm action={createCustomerAction} />
    </>
  );
}
