/** What came of an action: a sentence, faults by field, and what is shown once. */
export type ActionState = {
  done: string | null;
  error: string | null;
  fields: Record<string, string>;
  /** A password link or an access token, to be copied now. */
  secret: string | null;
};

export const UNTOUCHED: ActionState = { done: null, error: null, fields: {}, secret: null };
