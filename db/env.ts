import { join } from 'node:path';
import { z } from 'zod';

/** An empty variable counts as not set. */
const optionalText = z
  .string()
  .optional()
  .transform((text) => (text === '' ? undefined : text));
const port = z.coerce.number().int().min(1).max(65535);

const envSchema = z.object({
  /** The SQLite file; everything the product writes stands beside it. */
  DATABASE_FILE: z.string().default(join('var', 'floorwright.db')),
  /** Folder of the mail files that the local SMTP fake keeps. */
  MAIL_FOLDER: z.string().default(join('var', 'mail')),
  /** smtp:// or smtps:// address of the mail server; not set: the local fake. */
  SMTP_URL: optionalText,
  /** Sender of every mail. */
  MAIL_FROM: z.string().default('Floorwright <rosters@floorwright.example>'),
  /** Where people reach the product; links in mails begin with it. */
  NEXTAUTH_URL: z.url().default('http://localhost:3000'),
  NEXTAUTH_SECRET: optionalText,
  /** on: load the demo organisation into an empty database and offer its accounts at sign-in. */
  DEMO: z.enum(['on', 'off']).default('on'),
  /** Longest run in seconds. */
  RUN_SECONDS: z.coerce.number().int().min(5).max(3600).default(60),
  /** Solver threads: a run uses two when it can, further runs wait. */
  SOLVER_THREADS: z.coerce.number().int().min(1).max(16).default(2),
  /** ISO instant at which the product's clock starts instead of now: for tests and demonstrations. */
  CLOCK_STARTS_AT: optionalText,
  LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
  PORT: port.default(3000),
});

export type Env = z.infer<typeof envSchema>;

let parsed: Env | undefined;

/** The settings, read once. Throws one sentence per wrong variable. The only reader of process.env. */
export function env(): Env {
  if (parsed) return parsed;
  const outcome = envSchema.safeParse(process.env);
  if (!outcome.success) {
    const lines = outcome.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The environment is not usable:\n${lines.join('\n')}`);
  }
  parsed = outcome.data;
  return parsed;
}
