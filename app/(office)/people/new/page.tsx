import type { Metadata } from "next";
import { PageHeader } from "@/components/layout/page-header";
import { InviteForm } from "@/components/people/people-forms";
import { inviteStaffAction } from "../actions";

export const metadata: Metadata = { title: "Invite somebody" };

export default function InvitePage() {
  return (
    <>
      <PageHeader title="Invite somebody" />
      <InviteForm action={inviteStaffAction} />
    </>
  );
}
