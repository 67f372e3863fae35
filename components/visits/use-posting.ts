"use client";

import { useQueryClient } from "@tanstack/react-query";
import type { FormAction } from "@/components/form/form";
import { postJson, Refused } from "@/lib/queries/get-json";
import { BOOKING_KEYS } from "@/lib/queries/visits";

/** Posts, then looks again at everything that a booking can change. */
export function usePosting() {
  const client = useQueryClient();
  return async <T>(url: string, body: unknown): Promise<T> => {
    try {
      return await postJson<T>(url, body);
    } finally {
      for (const queryKey of BOOKING_KEYS) void client.invalidateQueries({ queryKey });
    }
  };
}

/** A form that posts JSON: refusals come back to their fields, as from any form. */
export const formAction =
  (post: (values: Record<string, string>) => Promise<string | undefined>): FormAction =>
  async (_, form) => {
    const values = Object.fromEntries([...form.entries()].map(([name, value]) => [name, String(value)]));
    try {
      return { ok: true, message: await post(values), at: Date.now() };
    } catch (error) {
      const fieldErrors = error instanceof Refused ? error.fieldErrors : {};
      const message = error instanceof Error ? error.message : "The server did not answer";
      return { ok: false, message, fieldErrors, values, at: Date.now() };
    }
  };
