import { z } from 'zod';

const url = z.string().regex(/^postgres(ql)?:\/\//, 'must be a postgres:// address');
const isLoopback = (origin: string) => ['localhost', '127.0.0.1', '[::1]'].includes(new URL(origin).hostname);

const databaseSchema = z.object({
  /** The app's own role: no superuser, no BYPASSRLS, owner of nothing. */
  DATABASE_URL: url,
  /** Most connections of the app's pool. */
  DATABASE_POOL: z.coerce.number().int().min(2).max(50).default(10),
});

const configSchema = databaseSchema
  .extend({
    NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
    HOST: z.string().default('127.0.0.1'),
    PORT: z.coerce.number().int().min(0).max(65535).default(3000),
    /** Where people reach Plait, used in cookies and the same-origin rule; never the Host header. */
    PUBLIC_ORIGIN: z.url().transform((value) => new URL(value).origin),
    /** At least 32 bytes; two, separated by a comma, while one is being replaced (the first signs). */
    SESSION_SECRET: z
      .string()
      .transform((value) => value.split(','))
      .pipe(z.array(z.string().min(32, 'must have at least 32 characters')).min(1).max(2)),
    /** Addresses of reverse proxies whose X-Forwarded headers are believed, separated by commas. */
    TRUST_PROXY: z
      .string()
      .default('')
      .transform((value) =>
        value
          .split(',')
          .map((part) => part.trim())
          .filter(Boolean),
      ),
    LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
    /** Folder of the built client; not set while Vite serves it. */
    CLIENT_DIR: z.string().optional(),
    /** The list of demo people offered on the demo school's sign-in page. Set by `npm start` on its own cluster only. */
    DEMO_FILE: z.string().optional(),
  })
  .refine((c) => c.PUBLIC_ORIGIN.startsWith('https:') || isLoopback(c.PUBLIC_ORIGIN), {
    path: ['PUBLIC_ORIGIN'],
    message: 'must be https, or http on this machine only',
  })
  .refine((c) => !c.DEMO_FILE || (isLoopback(c.PUBLIC_ORIGIN) && c.PUBLIC_ORIGIN.startsWith('http:')), {
    path: ['DEMO_FILE'],
    message: 'is for a demo on this machine only',
  });

export type Config = z.output<typeof configSchema>;

function read<T>(schema: z.ZodType<T>, environment: NodeJS.ProcessEnv): T {
  const parsed = schema.safeParse(environment);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`Plait cannot start with this configuration:\n${lines.join('\n')}`);
}

/** Reads the environment once, at the start. @throws Error that names each wrong variable, never its value */
export const readConfig = (environment: NodeJS.ProcessEnv): Config => read(configSchema, environment);

/** The part that the database connection needs: all that commands and seeds are given. @throws Error as `readConfig` */
export const readDatabaseConfig = (environment: NodeJS.ProcessEnv): z.output<typeof databaseSchema> =>
  read(databaseSchema, environment);
