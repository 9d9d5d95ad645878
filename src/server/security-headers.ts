import { config } from "./config.ts";

const DIRECTIVES = [
  "default-src 'self'",
  "base-uri 'none'",
  "connect-src 'self'",
  "font-src 'self'",
  "form-action 'self'",
  "frame-ancestors 'none'",
  "img-src 'self' data: blob:",
  "object-src 'none'",
  "worker-src 'self'",
];

/** Source list of one directive in a policy, or nothing. */
function sources(policy: string, directive: string): string {
  const found = policy.split(";").find((part) => part.trim().startsWith(`${directive} `));
  return found?.trim().slice(directive.length + 1) ?? "'self'";
}

/**
 * The content security policy of a page, from the hashes Astro worked out for its own scripts and styles.
 * Style elements that the grid adds in the browser carry the nonce; style attributes are allowed, because
 * server-rendered drawings use them and an attribute cannot load anything.
 */
export function contentSecurityPolicy(astroPolicy: string, styleNonce: string): string {
  return [
    ...DIRECTIVES,
    `script-src ${sources(astroPolicy, "script-src")}`,
    `style-src-elem ${sources(astroPolicy, "style-src")} 'nonce-${styleNonce}'`,
    "style-src-attr 'unsafe-inline'",
  ].join("; ");
}

/** Sets the headers that every reply carries. */
export function addSecurityHeaders(headers: Headers): void {
  headers.set("x-content-type-options", "nosniff");
  headers.set("referrer-policy", "same-origin");
  headers.set("cross-origin-opener-policy", "same-origin");
  headers.set("cross-origin-resource-policy", "same-origin");
  headers.set("permissions-policy", "camera=(), geolocation=(), microphone=(), payment=(), usb=()");
  if (config().origin.startsWith("https:"))
    headers.set("strict-transport-security", "max-age=31536000; includeSubDomains");
}
