import { handlers } from "@/lib/auth/auth";

/**
 * The one address of Auth.js that is open: where a one-time link is spent. Its others would sign people in past the
 * limits that our own forms count against.
 */
export const { GET } = handlers;
