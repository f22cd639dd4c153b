import { z } from 'zod';

const schema = z.object({
  DATABASE_URL: z
    .string()
    .regex(/^(file:|libsql:|https?:|wss?:)./, 'must be file:… or the address of a libSQL server')
    .default('file:data/leeside.db'),
  NEXTAUTH_SECRET: z.string().min(32, 'must be at least 32 characters'),
  NEXTAUTH_URL: z.url('must be the address people open, such as https://leeside.example.test'),
});

export type Env = z.infer<typeof schema>;

/** What a developer's own server runs with when nothing is set. Never in production. */
const developmentDefaults = {
  NEXTAUTH_SECRET: 'for development on this computer only, not a secret',
  NEXTAUTH_URL: 'http://localhost:3000',
};

let read: Env | null = null;

/** The settings from the environment. In production a missing one stops the start, by name. */
export function env(): Env {
  if (read) return read;
  const given = Object.fromEntries(Object.entries(process.env).filter(([, value]) => value !== ''));
  const source: Record<string, unknown> =
    process.env.NODE_ENV === 'production' ? given : { ...developmentDefaults, ...given };
  const parsed = schema.safeParse(source);
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => {
      const name = String(issue.path[0]);
      return `${name} ${name in source ? issue.message : 'is missing'}`;
    });
    throw new Error(
      `Leeside cannot start: ${lines.join('; ')}. Set this in the environment and start again.`,
    );
  }
  read = parsed.data;
  return read;
}
