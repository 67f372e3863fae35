/** What a form's action answers: typed values come back, errors stand at their fields. */
export type FormState = {
  ok: boolean;
  message?: string;
  fieldErrors?: Record<string, string[]>;
  values?: Record<string, string>;
  /** Tells one answer from the next. */
  at?: number;
};
