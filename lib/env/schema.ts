import { z } from 'zod';

const port = z.coerce.number().int().min(1).max(65_535);
/** An unset variable and an empty one mean the same. */
const optional = <T extends z.ZodType>(schema: T) => z.preprocess((value) => (value === '' ? undefined : value), schema.optional());
const withDefault = <T extends z.ZodType>(schema: T, value: string) =>
  z.preprocess((given) => (given === '' || given === undefined ? value : given), schema);

const trustProxy = z.union([z.enum(['true', 'false']).transform((word) => (word === 'true' ? 1 : 0)), z.coerce.number().int().min(0).max(8)]);

/** Every variable the product reads. README.md ("Configuration") describes them for operators. */
export const environmentSchema = z.object({
  NODE_ENV: withDefault(z.enum(['development', 'production', 'test']), 'production'),
  /** Where people reach the site; links in mail and cookie flags follow it. */
  PUBLIC_URL: withDefault(z.url({ protocol: /^https?$/ }), 'http://127.0.0.1:3000'),
  /** Address the realtime process listens on. */
  HOST: withDefault(z.string(), '127.0.0.1'),
  /** Port that web listens on. */
  PORT: withDefault(port, '3000'),
  DATABASE_URL: optional(z.url({ protocol: /^(mysql|mariadb)$/ })),
  REALTIME_PORT: withDefault(port, '3001'),
  /** Where browsers find realtime; without it `ws:` on REALTIME_PORT of the page's host. */
  REALTIME_URL: optional(z.url({ protocol: /^wss?$/ })),
  /** Where web finds realtime's internal calls; without it 127.0.0.1 on REALTIME_PORT. */
  REALTIME_INTERNAL_URL: optional(z.url({ protocol: /^https?$/ })),
  /** Shared by web and realtime for calls between them. */
  INTERNAL_SECRET: optional(z.string().min(32)),
  SMTP_URL: optional(z.url({ protocol: /^smtps?$/ })),
  MAIL_FROM: withDefault(z.string(), 'Holdoff <holdoff@localhost>'),
  /** Folder of the local mailbox; set by `npm start` in local mode only. */
  LOCAL_MAILBOX: optional(z.string()),
  S3_ENDPOINT: optional(z.url()),
  S3_REGION: withDefault(z.string(), 'us-east-1'),
  S3_BUCKET: withDefault(z.string(), 'holdoff'),
  S3_ACCESS_KEY_ID: optional(z.string()),
  S3_SECRET_ACCESS_KEY: optional(z.string()),
  /** How many proxies in front are trusted to have written `X-Forwarded-For`. */
  TRUST_PROXY: withDefault(trustProxy, '0'),
  LOG_LEVEL: withDefault(z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']), 'info'),
});

export type EnvironmentVariables = z.infer<typeof environmentSchema>;
