/**
 * What can be refused, by kind. Each kind is one HTTP status, mapped here and nowhere else.
 *   invalid    what was typed cannot be used (400)
 *   forbidden  not for this role (403)
 *   not-found  no such thing in this shop (404)
 *   conflict   somebody was faster, or the state of things forbids it (409)
 *   ask-first  possible, but it costs something that must be confirmed (409)
 *   too-many   tried too often from one address: wait (429)
 */
export const REFUSAL_STATUS = {
  invalid: 400,
  forbidden: 403,
  "not-found": 404,
  conflict: 409,
  "ask-first": 409,
  "too-many": 429,
} as const;
export type RefusalKind = keyof typeof REFUSAL_STATUS;

/** An expected refusal, in words for the person. Anything else that is thrown is a fault of ours and is logged. */
export class Refusal extends Error {
  constructor(
    readonly kind: RefusalKind,
    message: string,
    /** Words beside a field, by the field's name. */
    readonly fields: Record<string, string> = {},
    /** What the screen needs to ask or to show the other side. */
    readonly detail: Record<string, unknown> = {},
  ) {
    super(message);
  }
  get status() {
    return REFUSAL_STATUS[this.kind];
  }
}
