/** The clock of a local time: `2026-12-01T07:00` is `07:00`. */
export const clockOf = (local: string): string => local.slice(11);
