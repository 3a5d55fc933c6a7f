// What may go wrong on the way to a page: one table from code to HTTP status and sentence. Refusals and findings of
// the carton core are not here (refusals.ts, findings.ts).

export interface ErrorWords {
  readonly status: number;
  readonly title: string;
  readonly sentence: string;
}

export const errorTable = {
  "database-lost": {
    status: 503,
    title: "The database does not answer",
    sentence: "The database does not answer. What you typed is kept here; try again in a moment.",
  },
  "signed-out": {
    status: 401,
    title: "Sign in again",
    sentence: "Your sign-in has ended. What you typed is kept here: sign in again in another tab, then save once more.",
  },
  "not-allowed": {
    status: 403,
    title: "Not for your role",
    sentence: "Your role does not do this. Ask the owner of the studio if it should.",
  },
  "not-found": {
    status: 404,
    title: "Nothing here",
    sentence: "There is nothing at this address. It may have been deleted, or the address may be mistyped.",
  },
  conflict: {
    status: 409,
    title: "Somebody saved first",
    sentence: "Somebody else saved this in the meantime. Both versions are kept: choose one.",
  },
  "too-large": {
    status: 413,
    title: "Too much at once",
    sentence: "What was sent is larger than this page takes. Send less at once.",
  },
  "foreign-origin": {
    status: 400,
    title: "Sent from another site",
    sentence: "This came from a page of another site, so nothing was changed. Open the page here and send it again.",
  },
  unknown: {
    status: 500,
    title: "This did not work",
    sentence: "Something is wrong on our side, and it has been written down. Try again; if it stays, pass on the number below.",
  },
} as const satisfies Record<string, ErrorWords>;

export type ErrorCode = keyof typeof errorTable;

/** What a page or a fetcher gets to know of an error. `id` is in the server's log beside the details. */
export interface Problem extends ErrorWords {
  readonly code: ErrorCode;
  readonly id: string | null;
}

export function problemFor(code: ErrorCode, id: string | null = null): Problem {
  return { code, id, ...errorTable[code] };
}

/** An expected error. Thrown anywhere below a loader or action; turned into an answer in one place. */
export class KnownError extends Error {
  override readonly name = "KnownError";
  constructor(readonly code: ErrorCode) {
    super(errorTable[code].sentence);
  }
}

/**
 * The problem inside what a failed action returned (`useActionData()`, `fetcher.data`) or inside the `data` of a
 * route error response; null when there is none. Actions return `{ problem }` instead of throwing, so that the page
 * keeps what was typed.
 */
export function problemOf(value: unknown): Problem | null {
  if (typeof value !== "object" || value === null || !("problem" in value)) return null;
  const problem = value.problem;
  const isOurs = typeof problem === "object" && problem !== null && "code" in problem && String(problem.code) in errorTable;
  return isOurs ? (problem as Problem) : null;
}

const lostCodes = new Set([
  "ECONNREFUSED", "ECONNRESET", "ECONNABORTED", "EPIPE", "ETIMEDOUT", "ENOTFOUND", "EAI_AGAIN", "EHOSTUNREACH", "ENETUNREACH",
  "PROTOCOL_CONNECTION_LOST", "PROTOCOL_ENQUEUE_AFTER_FATAL_ERROR", "POOL_CLOSED",
  "ER_SERVER_SHUTDOWN", "ER_CON_COUNT_ERROR", "ER_CONNECTION_KILLED", "ER_NORMAL_SHUTDOWN", "ER_ABORTING_CONNECTION",
]);

/** Whether an error, or what caused it, says that the database cannot be reached. */
export function isDatabaseLost(error: unknown): boolean {
  for (let at = error, depth = 0; at instanceof Error && depth < 8; at = at.cause, depth += 1) {
    if ("code" in at && typeof at.code === "string" && lostCodes.has(at.code)) return true;
    if (/connection is in closed state|Connection lost: The server closed/i.test(at.message)) return true;
    if (at instanceof AggregateError && at.errors.some((inner) => isDatabaseLost(inner))) return true;
  }
  return false;
}
