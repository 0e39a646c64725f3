import * as z from 'zod';

const port = z.coerce.number().int().min(1).max(65_535);
const secret = z.string().min(32, 'must be at least 32 characters');
const database = z.string().regex(/^mariadb:\/\//, 'must begin with mariadb://');

/** The environment variables the server reads; everything else in the environment is ignored. */
export const configSchema = z
  .object({
    PORT: port.default(8080),
    DATABASE_URL: database,
    MIGRATION_DATABASE_URL: database.optional(),
    DATA_DIR: z.string().min(1),
    SESSION_SECRET: secret,
    PUBLIC_URL: z.url({ protocol: /^https?$/ }).optional(),
    SMTP_URL: z
      .string()
      .regex(/^smtps?:\/\//, 'must begin with smtp:// or smtps://')
      .optional(),
    MAIL_FROM: z.email().default('workshop@bolewright.invalid'),
    /** Keys of the payment service; both, or neither for the one that stands in. */
    STRIPE_SECRET_KEY: z.string().min(16).optional(),
    STRIPE_WEBHOOK_SECRET: z.string().min(16).optional(),
    LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
    LOG_FILE: z.string().min(1).optional(),
    REQUESTS_PER_MINUTE: z.coerce.number().int().min(1).default(900),
    DEMONSTRATION_PASSWORD: z.string().min(15).optional(),
    SEED_ONLY: z.literal('yes').optional(),
    WEB_DIR: z.string().min(1).default('dist/web'),
    ALLOW_UNSAFE_DURABILITY: z.literal('yes').optional(),
  })
  .refine((env) => (env.STRIPE_SECRET_KEY === undefined) === (env.STRIPE_WEBHOOK_SECRET === undefined), {
    message: 'needs STRIPE_SECRET_KEY beside it, and the other way round',
    path: ['STRIPE_WEBHOOK_SECRET'],
  })
  .transform((env) => ({
    port: env.PORT,
    databaseUrl: env.DATABASE_URL,
    migrationDatabaseUrl: env.MIGRATION_DATABASE_URL ?? env.DATABASE_URL,
    dataFolder: env.DATA_DIR,
    webFolder: env.WEB_DIR,
    sessionSecret: env.SESSION_SECRET,
    publicUrl: env.PUBLIC_URL ? new URL(env.PUBLIC_URL) : undefined,
    smtpUrl: env.SMTP_URL,
    mailFrom: env.MAIL_FROM,
    stripe:
      env.STRIPE_SECRET_KEY === undefined || env.STRIPE_WEBHOOK_SECRET === undefined
        ? undefined
        : { secretKey: env.STRIPE_SECRET_KEY, webhookSecret: env.STRIPE_WEBHOOK_SECRET },
    logLevel: env.LOG_LEVEL,
    logFile: env.LOG_FILE,
    requestsPerMinute: env.REQUESTS_PER_MINUTE,
    demonstrationPassword: env.DEMONSTRATION_PASSWORD,
    seedsOnly: env.SEED_ONLY === 'yes',
    mayBeUnsafe: env.ALLOW_UNSAFE_DURABILITY === 'yes',
  }));
