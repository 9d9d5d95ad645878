import { z } from "zod";

/**
 * The settings of one installation, read once from the environment. Everything has a default that suits a
 * person trying Tinpenny on their own machine; README lists them.
 */
const port = z.coerce.number().int().min(1).max(65535);
const url = z.url({ protocol: /^https?$/ }).transform((text) => text.replace(/\/+$/, ""));
const optional = <T extends z.ZodType>(shape: T) =>
  z.preprocess((value) => (value === "" ? undefined : value), shape.optional());

const Environment = z
  .object({
    TINPENNY_HOST: z.string().min(1).default("127.0.0.1"),
    TINPENNY_PORT: port.default(4321),
    TINPENNY_ORIGIN: optional(url),
    TINPENNY_DATA: z.string().min(1).default("data"),
    TINPENNY_DEMO: z.enum(["on", "off"]).default("on"),
    TINPENNY_TRUST_PROXY: z.enum(["on", "off"]).default("off"),
    TINPENNY_SMTP_URL: optional(z.url({ protocol: /^smtps?$/ })),
    TINPENNY_MAIL_FROM: z.string().min(3).default("Tinpenny <tinpenny@localhost>"),
    TINPENNY_LETTERS_PORT: port.default(4325),
    TINPENNY_RATES_URL: optional(z.url({ protocol: /^https?$/ })),
    TINPENNY_IDENTITY_NAME: optional(z.string().min(1).max(40)),
    TINPENNY_IDENTITY_ISSUER: optional(url),
    TINPENNY_IDENTITY_CLIENT: optional(z.string().min(1)),
    TINPENNY_IDENTITY_SECRET: optional(z.string().min(1)),
    TINPENNY_IDENTITY_SCOPES: z.string().default("openid email profile"),
  })
  .refine((env) => Boolean(env.TINPENNY_IDENTITY_ISSUER) === Boolean(env.TINPENNY_IDENTITY_CLIENT), {
    path: ["TINPENNY_IDENTITY_CLIENT"],
    message: "Set both TINPENNY_IDENTITY_ISSUER and TINPENNY_IDENTITY_CLIENT, or neither.",
  });

export interface IdentityProviderSettings {
  name: string;
  issuer: string;
  clientId: string;
  clientSecret: string | null;
  scopes: string[];
}

export interface Config {
  host: string;
  port: number;
  /** The address people type, without a slash at the end; links in letters begin with it. */
  origin: string;
  dataFolder: string;
  demo: boolean;
  trustProxy: boolean;
  /** `null`: letters stay on this machine and can be read on the letters page. */
  smtpUrl: string | null;
  mailFrom: string;
  lettersPort: number;
  /** Where reference rates can be fetched from; `null`: they come as files or by hand. */
  ratesUrl: string | null;
  identityProvider: IdentityProviderSettings | null;
}

function identityProvider(env: z.infer<typeof Environment>): IdentityProviderSettings | null {
  if (!env.TINPENNY_IDENTITY_ISSUER || !env.TINPENNY_IDENTITY_CLIENT) return null;
  return {
    name: env.TINPENNY_IDENTITY_NAME ?? new URL(env.TINPENNY_IDENTITY_ISSUER).host,
    issuer: env.TINPENNY_IDENTITY_ISSUER,
    clientId: env.TINPENNY_IDENTITY_CLIENT,
    clientSecret: env.TINPENNY_IDENTITY_SECRET ?? null,
    scopes: env.TINPENNY_IDENTITY_SCOPES.split(/\s+/).filter(Boolean),
  };
}

/**
 * Reads settings from the variables of an environment.
 *
 * @throws Error that lists every variable that is wrong, for the person who starts the server.
 */
export function readConfig(variables: Record<string, string | undefined>): Config {
  const read = Environment.safeParse(variables);
  if (!read.success) {
    const wrong = read.error.issues.map((issue) => `  ${issue.path.join(".")}: ${issue.message}`);
    throw new Error(`Tinpenny cannot start with these settings:\n${wrong.join("\n")}`);
  }
  const env = read.data;
  const host = env.TINPENNY_HOST.includes(":") ? `[${env.TINPENNY_HOST}]` : env.TINPENNY_HOST;
  return {
    host: env.TINPENNY_HOST,
    port: env.TINPENNY_PORT,
    origin: env.TINPENNY_ORIGIN ?? `http://${host}:${env.TINPENNY_PORT}`,
    dataFolder: env.TINPENNY_DATA,
    demo: env.TINPENNY_DEMO === "on",
    trustProxy: env.TINPENNY_TRUST_PROXY === "on",
    smtpUrl: env.TINPENNY_SMTP_URL ?? null,
    mailFrom: env.TINPENNY_MAIL_FROM,
    lettersPort: env.TINPENNY_LETTERS_PORT,
    ratesUrl: env.TINPENNY_RATES_URL ?? null,
    identityProvider: identityProvider(env),
  };
}

let settings: Config | undefined;

/** This process's settings. */
export function config(): Config {
  settings ??= readConfig(process.env);
  return settings;
}

/** Puts other settings in their place; without an argument the environment's own again. For tests. */
export function setConfig(other?: Config): void {
  settings = other;
}

/** Whether the server can only be reached from this machine; the letters page exists only then. */
export function listensOnLoopback(host: string): boolean {
  return host === "localhost" || host === "::1" || /^127(\.\d{1,3}){3}$/.test(host);
}

/**
 * Whether letters are kept on this machine and shown on a page: no mail server is configured, and nobody
 * but this machine can reach the page. A loopback server behind a public address does not count.
 */
export function lettersStayHere(settings: Config): boolean {
  const { hostname } = new URL(settings.origin);
  return (
    settings.smtpUrl === null &&
    !settings.trustProxy &&
    listensOnLoopback(settings.host) &&
    listensOnLoopback(hostname.replace(/^\[|\]$/g, ""))
  );
}
