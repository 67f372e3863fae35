"use server";

import { acceptInvitation } from "@/lib/services/people/accept-invitation";
import { resetPassword } from "@/lib/services/people/reset-password";
import { answerVisit } from "@/lib/services/visits/answer";
import { action } from "@/lib/web/action";
import { askPasswordReset, leave, linkSignIn, passwordSignIn } from "@/lib/web/sign-in";

export const passwordSignInAction = passwordSignIn;
export const linkSignInAction = linkSignIn;
export const askPasswordResetAction = askPasswordReset;
export const leaveAction = leave;
export const acceptInvitationAction = action(acceptInvitation, {
  linkField: "token",
  to: () => "/sign-in?from=invitation",
});
export const resetPasswordAction = action(resetPassword, { linkField: "token", to: () => "/sign-in?from=reset" });
export const answerByLinkAction = action(answerVisit, { linkField: "token" });
