import "server-only";
import { z } from "zod";

const optional = z
  .string()
  .trim()
  .transform((value) => (value === "" ? undefined : value))
  .optional();

/** The environment, read once. Every name is documented in README.md. */
const schema = z.object({
  DATABASE_URL: z.string().min(1),
  DATABASE_POOL_MAX: z.coerce.number().int().min(1).max(200).default(10),
  NEXTAUTH_SECRET: z.string().min(32),
  /** Address people type; links in mails start with it. */
  BYSSUS_URL: z.url().default("http://127.0.0.1:3000"),
  /** The demo shows its accounts on the sign-in page and catches its own mail. */
  BYSSUS_DEMO: z.enum(["0", "1"]).default("0"),
  /** Folder for photos when no object store is configured. */
  BYSSUS_DATA_DIR: z.string().default(".local/data"),
  SMTP_URL: optional,
  MAIL_FROM: z.string().default("Byssus <byssus@demo.byssus.example>"),
  /** Port of the local mail sink, used when SMTP_URL is empty in demo or development. */
  BYSSUS_SINK_PORT: z.coerce.number().int().default(2525),
  LOG_LEVEL: z.enum(["fatal", "error", "warn", "info", "debug", "trace", "silent"]).default("info"),
  NODE_ENV: z.enum(["development", "production", "test"]).default("development"),
});

export type Env = z.infer<typeof schema>;

let parsed: Env | undefined;

/** @throws Error that names the variables which are missing or wrong. */
export function env(): Env {
  if (!parsed) {
    const result = schema.safeParse(process.env);
    if (!result.success) throw new Error(`Environment: ${z.prettifyError(result.error)}`);
    parsed = result.data;
  }
  return parsed;
}

/** True where mail is caught by the local sink and its mailbox page is shown. */
export function usesMailSink(): boolean {
  const { SMTP_URL, BYSSUS_DEMO, NODE_ENV } = env();
  return SMTP_URL === undefined && (BYSSUS_DEMO === "1" || NODE_ENV !== "production");
}

/** The address people type, without a slash at the end. */
export function publicUrl(): string {
  return env().BYSSUS_URL.replace(/\/+$/, "");
}
