/**
 * Every failure a person can meet: its HTTP status, and the sentences for it. `title` says what happened,
 * `detail` what to do. Parameters are named in braces. Nothing else in the server writes such sentences.
 */
export const SENTENCES = {
  "sign-in-needed": { status: 401, title: "You are not signed in.", detail: "Sign in, then try again." },
  "second-factor-needed": {
    status: 401,
    title: "Your sign-in is not finished.",
    detail: "Enter the code from your authenticator, or a recovery code.",
  },
  "role-may-not": {
    status: 403,
    title: "Your role as {role} may not do this.",
    detail: "In this workshop it can be done by: {roles}.",
  },
  "other-origin": {
    status: 403,
    title: "The request came from another site.",
    detail: "Open Tinpenny itself at {origin} and try again there.",
  },
  "not-found": {
    status: 404,
    title: "There is nothing here.",
    detail: "It may have been removed, or it belongs to a workshop you are not in.",
  },
  "not-this-method": {
    status: 405,
    title: "This address does not take {method}.",
    detail: "It takes: {methods}.",
  },
  "changed-meanwhile": {
    status: 409,
    title: "Somebody changed this in the meantime.",
    detail: "Look at both values and choose which one stays.",
  },
  "too-large": {
    status: 413,
    title: "This is larger than {limit}.",
    detail: "Send less at a time.",
  },
  "wrong-media-type": {
    status: 415,
    title: "The request has the wrong content type.",
    detail: "Send it as {expected}.",
  },
  "not-json": { status: 400, title: "The request is not readable JSON.", detail: "{reason}" },
  "wrong-input": {
    status: 422,
    title: "Some of this cannot be taken as it is.",
    detail: "Each field below says what is right.",
  },
  "too-many-attempts": {
    status: 429,
    title: "Too many attempts.",
    detail: "Wait {wait}, then try again.",
  },
  "our-mistake": {
    status: 500,
    title: "Tinpenny made a mistake here.",
    detail: "Nothing was changed. Try again; if it comes back, tell the person who runs this server.",
  },
} as const satisfies Record<string, { status: number; title: string; detail: string }>;

export type ProblemCode = keyof typeof SENTENCES;

/** Puts parameters into a sentence. */
export function sentence(text: string, parameters: Record<string, string | number>): string {
  return text.replace(/\{(\w+)\}/g, (_, name: string) => String(parameters[name] ?? ""));
}
