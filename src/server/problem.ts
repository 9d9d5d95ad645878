import { type ProblemCode, SENTENCES, sentence } from "./sentences.ts";

/** One field that cannot be taken: `at` is its path in the input, such as `breaks.2.price`. */
export interface FieldError {
  at: string;
  message: string;
}

interface ProblemDetails {
  parameters?: Record<string, string | number>;
  errors?: FieldError[];
  /** For a clash: the row as it stands now. */
  current?: unknown;
  headers?: Record<string, string>;
}

/** The body of a failed request (RFC 9457), as the browser and scripts read it. */
export interface ProblemBody {
  type: string;
  title: string;
  status: number;
  detail: string;
  code: ProblemCode;
  errors?: FieldError[];
  current?: unknown;
}

/** A failure we expect: thrown anywhere in the server, turned into a reply in one place. */
export class Problem extends Error {
  constructor(
    readonly code: ProblemCode,
    readonly details: ProblemDetails = {},
  ) {
    super(code);
  }

  body(): ProblemBody {
    const { status, title, detail } = SENTENCES[this.code];
    const { parameters = {}, errors, current } = this.details;
    return {
      type: `urn:tinpenny:problem:${this.code}`,
      title: sentence(title, parameters),
      status,
      detail: sentence(detail, parameters),
      code: this.code,
      ...(errors && { errors }),
      ...(current !== undefined && { current }),
    };
  }
}

/** The reply to a failed request: `application/problem+json`. */
export function problemReply(problem: Problem): Response {
  const body = problem.body();
  return new Response(JSON.stringify(body), {
    status: body.status,
    headers: {
      "content-type": "application/problem+json",
      "cache-control": "no-store",
      ...problem.details.headers,
    },
  });
}

/** One field that is wrong for a reason only the server can know. */
export function wrongField(at: string, message: string): Problem {
  return new Problem("wrong-input", { errors: [{ at, message }] });
}
