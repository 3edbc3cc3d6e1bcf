import { z } from 'zod'

const flag = z
  .enum(['0', '1'])
  .default('0')
  .transform((value) => value === '1')

const empty = (value: unknown) => (value === '' ? undefined : value)
const optional = <T extends z.ZodType>(type: T) => z.preprocess(empty, type.optional())

const variables = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
  SCRIM_MODE: z.enum(['demo', 'live']).default('demo'),
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  DATABASE_OWNER_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  HOST: z.string().min(1).default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(4600),
  SCRIM_ADDRESS: optional(z.url({ protocol: /^https?$/ })),
  SCRIM_SECRET: z.string().regex(/^[0-9a-f]{64}$/, '32 bytes as hex'),
  SCRIM_LAN: flag,
  SCRIM_SIGN_UP: z.enum(['closed', 'open']).default('closed'),
  SCRIM_PROXIES: z.coerce.number().int().min(0).max(10).default(0),
  SCRIM_LOG: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('warn'),
  SMTP_URL: optional(z.url({ protocol: /^smtps?$/ })),
  SMTP_FROM: optional(z.string().min(3)),
})

/** What the process was told from outside, once and for all. */
export interface Env {
  mode: 'demo' | 'live'
  production: boolean
  /** Connects as the application's role, which owns no table. */
  databaseUrl: string
  /** Connects as the owner of the tables: for migrations and seeds at the start, and for nothing else. */
  databaseOwnerUrl: string
  host: string
  port: number
  /** What people type, without a slash at the end; links in mail and QR codes begin with it. */
  address: string
  /** Whether `address` is https: cookies are Secure and browsers are told to stay with it. */
  tls: boolean
  /** Signs the session cookie; 64 hex digits. */
  secret: string
  /** Whether phones of the local network may come. */
  lan: boolean
  /** Whether anybody who comes may make an account; the demo is always open, and the first organiser needs no leave. */
  openSignUp: boolean
  /** How many proxies stand in front, for the caller's true address. */
  proxies: number
  logLevel: 'fatal' | 'error' | 'warn' | 'info' | 'debug' | 'silent'
  /** Where mail goes; nothing when none is set up. */
  smtp: { url: string; from: string } | undefined
}

/**
 * Reads the environment; the only place that does.
 *
 * @throws {Error} naming every variable that is missing or malformed, never its value
 */
export function readEnv(source: NodeJS.ProcessEnv = process.env): Env {
  const read = variables.safeParse(source)
  if (!read.success) {
    const faults = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`)
    throw new Error(`The environment is not complete.\n${faults.join('\n')}`)
  }
  const env = read.data
  const address = (env.SCRIM_ADDRESS ?? `http://${env.HOST}:${env.PORT}`).replace(/\/+$/, '')
  return {
    mode: env.SCRIM_MODE,
    production: env.NODE_ENV === 'production',
    databaseUrl: env.DATABASE_URL,
    databaseOwnerUrl: env.DATABASE_OWNER_URL,
    host: env.HOST,
    port: env.PORT,
    address,
    tls: address.startsWith('https:'),
    secret: env.SCRIM_SECRET,
    lan: env.SCRIM_LAN,
    openSignUp: env.SCRIM_MODE === 'demo' || env.SCRIM_SIGN_UP === 'open',
    proxies: env.SCRIM_PROXIES,
    logLevel: env.SCRIM_LOG,
    smtp: env.SMTP_URL
      ? { url: env.SMTP_URL, from: env.SMTP_FROM ?? `Scrim <scrim@${new URL(address).hostname}>` }
      : undefined,
  }
}
