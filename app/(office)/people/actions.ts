"use server";

import { paths } from "@/lib/domain/shared/paths";
import { changeRole } from "@/lib/services/people/change-role";
import { endMembership } from "@/lib/services/people/end-membership";
import { inviteStaff } from "@/lib/services/people/invite-staff";
import { recordLicense } from "@/lib/services/people/record-license";
import { resendInvitation } from "@/lib/services/people/resend-invitation";
import { restoreMembership } from "@/lib/services/people/restore-membership";
import { action } from "@/lib/web/action";

export const inviteStaffAction = action(inviteStaff, { to: ({ memberId }) => paths.person(memberId) });
export const changeRoleAction = action(changeRole, { done: "Role changed" });
export const endMembershipAction = action(endMembership, { done: "Access ended" });
export const restoreMembershipAction = action(restoreMembership, { done: "Access restored" });
export const resendInvitationAction = action(resendInvitation, { done: "Invitation sent again" });
export const recordLicenseAction = action(recordLicense, { done: "License recorded" });
