"use client";

import { useSyncExternalStore } from "react";

const PHONE = "(max-width: 47.99rem)";

const subscribe = (changed: () => void) => {
  const query = window.matchMedia(PHONE);
  query.addEventListener("change", changed);
  return () => query.removeEventListener("change", changed);
};

/** Whether there is room for one column alone. The server does not know, and says no. */
export const usePhone = (): boolean =>
  useSyncExternalStore(
    subscribe,
    () => window.matchMedia(PHONE).matches,
    () => false,
  );
