/** The closed list of what can go wrong: one status and one sentence each. Nobody reads messages; everybody reads codes. */
export const errors = {
  bad_input: [422, "Please check the marked fields."],
  bad_json: [400, "The request was not readable JSON."],
  wrong_content_type: [415, "Send this as application/json."],
  body_too_large: [413, "That is more than we accept in one go."],
  not_signed_in: [401, "Please sign in first."],
  not_allowed: [403, "You have no right to do this."],
  cross_site: [403, "This request did not come from the shop's own pages. Reload the page and try again."],
  not_found: [404, "There is nothing here under that address."],
  stale_edit: [409, "Someone changed this meanwhile. Look at the current version and try again."],
  idempotency_reused: [409, "This Idempotency-Key was used for something else."],
  idempotency_missing: [400, "Send an Idempotency-Key with this request."],
  orders_closed: [409, "Orders for this market day are closed."],
  day_called_off: [409, "This market day is called off."],
  not_enough_left: [409, "There is not enough left for that market day."],
  below_minimum: [422, "The order is below the farm's minimum."],
  price_changed: [409, "A price changed since you filled your basket. Please look at the new total."],
  order_not_open: [409, "This order can no longer be changed."],
  already_checked_off: [409, "This pickup is already checked off."],
  nothing_to_undo: [409, "There is nothing to undo."],
  week_has_orders: [409, "People have ordered from this week, so it stays posted."],
  week_incomplete: [422, "The week is not ready to post."],
  in_use: [409, "This is still in use elsewhere."],
  name_taken: [409, "That name or address is taken."],
  day_not_over: [409, "This market day is not over yet."],
  sign_in_refused: [400, "That link or code does not work any more. Ask for a new one."],
  code_wrong: [400, "That code is not right."],
  last_owner: [409, "The farm needs at least one owner."],
  unreadable_photo: [422, "That file is not a photo we can read. Use a JPEG, PNG, WebP or AVIF picture."],
  unknown_zip: [404, "We do not know that ZIP code."],
  too_many_requests: [429, "That was too often in a short time. Please wait a little."],
  not_ready: [503, "The shop is starting or cannot reach its database. Try again in a moment."],
  internal: [500, "Something went wrong on our side. Nothing was saved."],
} as const satisfies Record<string, readonly [status: number, sentence: string]>;

export type ErrorCode = keyof typeof errors;

export type FieldError = { field: string; message: string };

/** An RFC 9457 problem document as the API answers it. `errors` is by field; `current` is the present state after a stale edit. */
export type Problem = {
  type: string;
  title: string;
  status: number;
  detail: string;
  code: ErrorCode;
  errors?: FieldError[];
  current?: unknown;
  requestId?: string;
};

export type ProblemExtras = { detail?: string; errors?: FieldError[]; current?: unknown; retryAfterS?: number };

/** A known failure. `detail` replaces the table's sentence where the case can be named more closely. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly extras: ProblemExtras;
  constructor(code: ErrorCode, extras: ProblemExtras = {}) {
    super(code);
    this.name = "AppError";
    this.code = code;
    this.extras = extras;
  }
}

/** The problem document of an error code, without the request's id. */
export function problemOf(code: ErrorCode, extras: ProblemExtras = {}): Problem {
  const [status, sentence] = errors[code];
  return {
    type: `urn:loamless:${code.replaceAll("_", "-")}`,
    title: sentence,
    status,
    detail: extras.detail ?? sentence,
    code,
    ...(extras.errors && { errors: extras.errors }),
    ...(extras.current !== undefined && { current: extras.current }),
  };
}
