/**
 * The one shape in which anything goes wrong. `message` is for the person: what happened and what to do next.
 * Detail for the log never travels in it.
 */
export type FaultCode =
  "signed-out" | "refused" | "not-found" | "invalid" | "conflict" | "too-many" | "too-large" | "unsupported" | "broken";

export interface Fault {
  code: FaultCode;
  message: string;
  /** Field name → what to do about it. */
  fields?: Record<string, string>;
  /** Short mark that a person can read out and that the log holds too. */
  ref?: string;
}

/** HTTP status of each fault, exhaustive by type. */
export const FAULT_STATUS: Record<FaultCode, number> = {
  "signed-out": 401,
  refused: 403,
  "not-found": 404,
  invalid: 400,
  conflict: 409,
  "too-many": 429,
  "too-large": 413,
  unsupported: 415,
  broken: 500,
};

/** Thrown anywhere below the wrappers; `act` and `handle` are the only places that catch it. */
export class FaultError extends Error {
  readonly fault: Fault;

  constructor(fault: Fault, options?: ErrorOptions) {
    super(fault.message, options);
    this.name = "FaultError";
    this.fault = fault;
  }
}

/** Throws a fault: `throw fault("conflict", "Somebody confirmed this case a minute ago. Reload to see it.")`. */
export function fault(code: FaultCode, message: string, fields?: Record<string, string>): FaultError {
  return new FaultError({ code, message, ...(fields ? { fields } : {}) });
}

/** RFC 9457 problem details for a fault. `title` is the message; `fields` is our extension member. */
export function toProblem(problem: Fault): Record<string, unknown> {
  return {
    type: `about:blank#${problem.code}`,
    title: problem.message,
    status: FAULT_STATUS[problem.code],
    code: problem.code,
    ...(problem.fields ? { fields: problem.fields } : {}),
    ...(problem.ref ? { ref: problem.ref } : {}),
  };
}
