import { z } from 'zod';

const environment = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  DATABASE_URL: z.string().min(1),
  DATABASE_OWNER_URL: z.string().min(1),
  SECRETS_DIR: z.string().min(1),
  DEMO: z.enum(['0', '1']).default('0'),
  /** The address people type; https here makes cookies Secure. */
  PUBLIC_URL: z.url().optional(),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('warn'),
});

export interface Settings {
  readonly development: boolean;
  readonly host: string;
  readonly port: number;
  readonly databaseUrl: string;
  readonly databaseOwnerUrl: string;
  readonly secretsDir: string;
  readonly demo: boolean;
  readonly secure: boolean;
  readonly logLevel: string;
}

/**
 * Reads the process's settings.
 * @throws Error with one sentence that names every variable that is missing or wrong.
 */
export function readSettings(env: Readonly<Record<string, string | undefined>>): Settings {
  const parsed = environment.safeParse(env);
  if (!parsed.success) {
    const wrong = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; ');
    throw new Error(`The environment is not right. ${wrong}`);
  }
  const e = parsed.data;
  return {
    development: e.NODE_ENV === 'development',
    host: e.HOST,
    port: e.PORT,
    databaseUrl: e.DATABASE_URL,
    databaseOwnerUrl: e.DATABASE_OWNER_URL,
    secretsDir: e.SECRETS_DIR,
    demo: e.DEMO === '1',
    secure: e.PUBLIC_URL?.startsWith('https:') ?? false,
    logLevel: e.LOG_LEVEL,
  };
}
