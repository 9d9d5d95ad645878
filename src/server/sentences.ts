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
  "wrong-credentials": {
    status: 401,
    title: "The email address and the password do not go together.",
    detail: "Try again, or have a link sent to you by email.",
  },
  "sign-in-again": {
    status: 403,
    title: "This needs a fresh sign-in.",
    detail: "Sign out, sign in again, and do it within a quarter of an hour.",
  },
  "not-for-scripts": {
    status: 403,
    title: "An access token cannot do this.",
    detail: "Sign in with a browser and do it there.",
  },
  "link-not-valid": {
    status: 410,
    title: "This link does not work any more.",
    detail: "A link works once and for a limited time. Ask for a new one.",
  },
  "already-set-up": {
    status: 409,
    title: "Tinpenny is set up already.",
    detail: "Sign in, or ask the owner of your workshop for an invitation.",
  },
  "account-exists": {
    status: 409,
    title: "There is an account with this address.",
    detail: "Sign in with it first, then take the invitation.",
  },
  "second-factor-on": {
    status: 409,
    title: "The second factor is on already.",
    detail: "Turn it off first if you have another authenticator.",
  },
  "second-factor-off": {
    status: 409,
    title: "No authenticator is being set up.",
    detail: "Begin again from your account page.",
  },
  "last-owner": {
    status: 409,
    title: "{name} is the only owner of this workshop.",
    detail: "Make somebody else an owner first.",
  },
  "already-in-workshop": {
    status: 409,
    title: "{name} is in this workshop already.",
    detail: "Change the role in the list of people.",
  },
  "currency-fixed": {
    status: 409,
    title: "The currency stays {currency} while the workshop has kits.",
    detail: "Prices are written down in it. Make a new workshop for another currency.",
  },
  "mail-not-set-up": {
    status: 503,
    title: "This server sends no mail.",
    detail: "The person who runs it has to name a mail server in TINPENNY_SMTP_URL.",
  },
  "mail-not-sent": {
    status: 503,
    title: "The letter could not be sent.",
    detail: "The mail server did not take it. Try again in a few minutes.",
  },
  "identity-failed": {
    status: 401,
    title: "Signing in with {provider} did not work.",
    detail: "Begin again. If it comes back, sign in with your password or a link.",
  },
  "identity-unreachable": {
    status: 502,
    title: "{provider} does not answer.",
    detail: "Try again later, or sign in with your password or a link.",
  },
  "identity-not-known": {
    status: 403,
    title: "Nobody here signs in with that {provider} account.",
    detail: "Sign in another way and connect it on your account page, or ask for an invitation.",
  },
  "identity-taken": {
    status: 409,
    title: "That {provider} account belongs to somebody else here.",
    detail: "Sign in with it to see whose it is.",
  },
  "rates-file-unreadable": {
    status: 422,
    title: "This is no file of reference rates.",
    detail:
      "Bring in the XML file of euro reference rates as the European Central Bank publishes it. Nothing was changed.",
  },
  "rates-lack-own-currency": {
    status: 422,
    title: "The file gives no rate for {currency}, in which the workshop reckons.",
    detail: "Set the rates by hand. Nothing was changed.",
  },
  "rates-not-configured": {
    status: 409,
    title: "No address of reference rates is set.",
    detail: "Bring in the file, or ask whoever runs this installation to set TINPENNY_RATES_URL.",
  },
  "rates-unreachable": {
    status: 502,
    title: "{host} gave no reference rates.",
    detail: "Try again later, or bring in the file. Nothing was changed.",
  },
  "upload-empty": {
    status: 422,
    title: "{name} holds no rows.",
    detail: "Choose a list with at least one row that is not blank.",
  },
  "upload-no-workbook": {
    status: 415,
    title: "{name} is no workbook that can be read.",
    detail: "XLSX and ODS can. Save the list as one of these or as CSV, or copy the cells and paste them.",
  },
  "upload-too-packed": {
    status: 413,
    title: "{name} is too large to unpack.",
    detail:
      "At most {most} can be read. Save the sheet with the list alone, or copy its cells and paste them.",
  },
  "upload-old-spreadsheet": {
    status: 415,
    title: "{name} is an old workbook, or locked with a password.",
    detail: "Save it as XLSX, ODS or CSV without a password, or copy the cells and paste them.",
  },
  "upload-not-text": {
    status: 415,
    title: "{name} is not plain text.",
    detail: "Bring in the list as CSV, TSV, XLSX or ODS, or copy its cells and paste them.",
  },
  "upload-too-long": {
    status: 413,
    title: "{name} has {found} {what}; at most {most} can be read.",
    detail: "Leave out what is no part of the list, or bring it in as several files.",
  },
  "no-draft-any-more": {
    status: 409,
    title: "This list is no draft any more: it was {state}.",
    detail: "Look at the list of what was brought in.",
  },
  "rows-to-settle": {
    status: 409,
    title: "Some rows must be settled before the list is brought in.",
    detail: "Settle rows {rows}. Nothing was changed.",
  },
  "supplier-not-said": {
    status: 409,
    title: "Nobody has said whose prices these are.",
    detail: "Choose the supplier of the {count} offers that name none, or leave their rows out.",
  },
  "difference-changed": {
    status: 409,
    title: "Somebody changed what this list is compared with.",
    detail: "Nothing was brought in. Look at the difference as it is now, then bring the list in.",
  },
  "nothing-to-bring-in": {
    status: 409,
    title: "There is nothing to bring in.",
    detail: "Everything in this list stands so already.",
  },
  "too-many-lines": {
    status: 422,
    title: "This list has {lines} lines; a kit holds at most {most}.",
    detail: "Leave rows out, or join equal lines.",
  },
  "later-list-first": {
    status: 409,
    title: "{name} was brought in after this list.",
    detail: "Take that one back first; then this one can be taken back.",
  },
  "changed-since-taken": {
    status: 409,
    title: "Some of what this list brought in was changed since.",
    detail: "Leave everything as it is, or take the list back all the same: then these later changes go too.",
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
