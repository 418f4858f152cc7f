/**
 * A form that was left in the middle: durable 300 ms after each change, offered once after a kill, and never
 * counted unless saved. `id` names the form and what it is bound to, for instance an outing and a target.
 */
export type Draft = {
  id: string;
  clubId: string;
  form: string;
  savedAt: number;
  values: unknown;
};
