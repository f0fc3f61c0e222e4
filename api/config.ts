import { z } from 'zod';

const flag = (preset: 'on' | 'off') =>
  z
    .enum(['on', 'off'], { error: 'must be on or off' })
    .default(preset)
    .transform((value) => value === 'on');
const port = z.coerce.number({ error: 'must be a number' }).int().min(0, 'must be a port').max(65535, 'must be a port');

/** Every variable that the server and the worker read, with its default; the README lists the same. */
const environmentSchema = z.object({
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
  DATABASE_URL: z.string({ error: 'is not set' }).regex(/^postgres(ql)?:/, 'must be a postgres:// address'),
  HOST: z.string().min(1).default('127.0.0.1'),
  PORT: port.default(4000),
  PUBLIC_URL: z.url({ protocol: /^https?$/, error: 'must be an http:// or https:// address' }).optional(),
  WEB_FOLDER: z.string().optional(),
  SESSION_SECRET: z.string({ error: 'is not set' }).min(16, 'must have at least 16 characters'),
  SECURE_COOKIES: flag('off'),
  BCRYPT_COST: z.coerce
    .number({ error: 'must be a number' })
    .int()
    .min(4, 'must be at least 10')
    .max(15, 'must be at most 15')
    .default(12),
  SIGN_IN_TRIES: z.coerce.number({ error: 'must be a number' }).int().min(1, 'must be at least 1').default(30),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
  DEMO: flag('off'),
  SMTP_URL: z.url({ protocol: /^smtps?$/, error: 'must be an smtp:// or smtps:// address' }).optional(),
  SMTP_HOST: z.string().optional(),
  SMTP_PORT: port.optional(),
  SMTP_USER: z.string().optional(),
  SMTP_PASSWORD: z.string().optional(),
  SMTP_SECURE: flag('off'),
  MAIL_FROM: z
    .string()
    .min(3)
    .max(320)
    .regex(/^[^\r\n]*$/, 'must be one line')
    .default('Thickset <thickset@localhost>'),
});
type Environment = z.infer<typeof environmentSchema>;

export type SmtpSettings = { host: string; port: number; secure: boolean; user?: string; password?: string };
export type Config = ReturnType<typeof toConfig>;

/** Parsed once, at the start. @throws Error with one sentence for each thing that is wrong */
export function readConfig(environment: Record<string, string | undefined>): Config {
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value !== ''));
  const parsed = environmentSchema.safeParse(given);
  if (!parsed.success) {
    throw new Error(parsed.error.issues.map(({ path, message }) => `${path.join('.')} ${message}.`).join('\n'));
  }
  const refused = refusals(parsed.data);
  if (refused.length > 0) throw new Error(refused.join('\n'));
  return toConfig(parsed.data);
}

function refusals(environment: Environment): string[] {
  const { NODE_ENV, BCRYPT_COST, HOST } = environment;
  const weak = NODE_ENV !== 'test' && BCRYPT_COST < 10 ? ['BCRYPT_COST must be at least 10.'] : [];
  return isLoopback(HOST) ? weak : [...weak, ...refusedInPublic(environment)];
}

/** What is good enough on one's own machine, and not where others can reach it. */
function refusedInPublic({ HOST, DEMO, SESSION_SECRET, SECURE_COOKIES, PUBLIC_URL }: Environment): string[] {
  const where = `while HOST is ${HOST}, which others can reach`;
  return [
    DEMO ? `DEMO must be off ${where}: the demo's passwords are public.` : '',
    SESSION_SECRET.length < 32 ? `SESSION_SECRET must have at least 32 random characters ${where}.` : '',
    /(.)\1{7}|secret|change|password|default/i.test(SESSION_SECRET)
      ? `SESSION_SECRET must be random, not a word ${where}.`
      : '',
    SECURE_COOKIES ? '' : `SECURE_COOKIES must be on ${where}, behind HTTPS.`,
    PUBLIC_URL?.startsWith('https:') ? '' : `PUBLIC_URL must be the https:// address that people use ${where}.`,
  ].filter((sentence) => sentence !== '');
}

export const isLoopback = (host: string): boolean =>
  host === 'localhost' || host === '::1' || /^127(\.\d{1,3}){3}$/.test(host);

function toConfig(environment: Environment) {
  const { HOST, PORT, NODE_ENV } = environment;
  return {
    environment: NODE_ENV,
    databaseUrl: environment.DATABASE_URL,
    host: HOST,
    port: PORT,
    publicUrl: (environment.PUBLIC_URL ?? `http://localhost:${PORT}`).replace(/\/+$/, ''),
    webFolder: environment.WEB_FOLDER,
    sessionSecret: environment.SESSION_SECRET,
    secureCookies: environment.SECURE_COOKIES,
    bcryptCost: environment.BCRYPT_COST,
    signInTries: environment.SIGN_IN_TRIES,
    logLevel: environment.LOG_LEVEL,
    demo: environment.DEMO,
    smtp: smtpOf(environment),
    mailFrom: environment.MAIL_FROM,
  };
}

function smtpOf(environment: Environment): SmtpSettings | undefined {
  if (environment.SMTP_URL) return smtpFromUrl(new URL(environment.SMTP_URL));
  if (!environment.SMTP_HOST) return undefined;
  const { SMTP_HOST: host, SMTP_SECURE: secure, SMTP_USER: user, SMTP_PASSWORD: password } = environment;
  return { host, port: environment.SMTP_PORT ?? (secure ? 465 : 587), secure, user, password };
}

function smtpFromUrl(url: URL): SmtpSettings {
  const secure = url.protocol === 'smtps:';
  const part = (text: string) => (text === '' ? undefined : decodeURIComponent(text));
  return {
    host: url.hostname,
    port: url.port ? Number(url.port) : secure ? 465 : 587,
    secure,
    user: part(url.username),
    password: part(url.password),
  };
}
