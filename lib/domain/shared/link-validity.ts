/** How long one-time addresses work: what makes them and the letters that say so read the same figures. */
export const INVITATION_DAYS = 14;
export const PASSWORD_RESET_HOURS = 1;
export const SIGN_IN_LINK_MINUTES = 15;
