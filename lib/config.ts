import { z } from 'zod'

/** An http(s) origin without path or query, as links are built from it. */
const origin = z.string().transform((value, ctx) => {
  const url = URL.canParse(value) ? new URL(value) : null
  if (url && /^https?:$/.test(url.protocol) && url.pathname === '/' && !url.search && !url.hash) return url.origin
  ctx.addIssue({ code: 'custom', message: 'must be an origin such as https://guide.example, without a path' })
  return z.NEVER
})

const schema = z
  .object({
    /** Set by `npm start` and the tests: invented data, sign-ins that are printed, loopback only. */
    LAMPLEAF_DEMO: z.enum(['0', '1']).default('0'),
    DATABASE_URL: z
      .string({ error: 'is missing: the address of the PostgreSQL database' })
      .regex(/^postgres(ql)?:\/\//, 'must begin with postgres:// or postgresql://'),
    /** Connections the web process may hold; budget: all processes together stay under max_connections. */
    DATABASE_POOL: z.coerce.number().int().min(1).max(100).default(10),
    /** The address people reach the site at. Links and origin checks trust this and no request header. */
    BASE_URL: origin.optional(),
    PORT: z.coerce.number().int().min(1).max(65535).default(3000),
    /** Threads that rank for the server; each keeps about 40 MB. */
    MATCH_THREADS: z.coerce.number().int().min(1).max(16).default(1),
  })
  .transform((env, ctx) => {
    const demo = env.LAMPLEAF_DEMO === '1'
    if (!env.BASE_URL && !demo) {
      ctx.addIssue({ code: 'custom', path: ['BASE_URL'], message: 'is missing: the address people reach the site at' })
      return z.NEVER
    }
    return {
      demo,
      databaseUrl: env.DATABASE_URL,
      databasePool: env.DATABASE_POOL,
      baseUrl: env.BASE_URL ?? `http://127.0.0.1:${env.PORT}`,
      matchThreads: env.MATCH_THREADS,
    }
  })

export type Config = z.output<typeof schema>

/**
 * The configuration from environment variables.
 * @throws Error naming each variable that is missing or wrong, one line each; an empty variable counts as absent
 */
export function parseConfig(env: Record<string, string | undefined>): Config {
  const given = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''))
  const parsed = schema.safeParse(given)
  if (parsed.success) return parsed.data
  const lines = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`)
  throw new Error(`Lampleaf cannot start. Set these environment variables:\n  ${lines.join('\n  ')}`)
}
