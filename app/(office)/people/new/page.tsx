import type { Metadata } from "next";
import { only } from "@/app/frame";
import { PageHeader } from "@/components/layout/page-header";
import { InviteForm } from "@/components/people/people-forms";
import { inviteStaffAction } from "../actions";

export const metadata: Metadata = { title: "Invite somebody" };

export default async function InvitePage() {
  await only("person:write");
  return (
    <>
      <PageHeader title="Invite somebody" />
      <InviteForm action={inviteStaffAction} />
    </>
  );
}
