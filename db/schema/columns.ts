import { char, customType, datetime } from 'drizzle-orm/mysql-core';
import type { z } from 'zod';

/** A ULID: 26 characters compared byte by byte, so that ids are case-sensitive whatever the table's collation. */
export const ulidColumn = customType<{ data: string; driverData: string }>({
  dataType: () => 'char(26) character set ascii collate ascii_bin',
});

/** A SHA-256 in lower-case hex. */
export const sha256Column = customType<{ data: string; driverData: string }>({
  dataType: () => 'char(64) character set ascii collate ascii_bin',
});

/** Text compared byte by byte (names that must be unique exactly as written). */
export const exactText = customType<{ data: string; driverData: string; config: { length: number } }>({
  dataType: (config) => `varchar(${config?.length ?? 120}) character set utf8mb4 collate utf8mb4_bin`,
});

/** Bytes up to 16 MiB. */
export const mediumBlob = customType<{ data: Uint8Array; driverData: Buffer }>({
  dataType: () => 'mediumblob',
  toDriver: (value) => Buffer.from(value.buffer, value.byteOffset, value.byteLength),
  fromDriver: (value) => new Uint8Array(value),
});

/** Bytes up to 4 GiB; one statement stays under the server's `max_allowed_packet`. */
export const longBlob = customType<{ data: Uint8Array; driverData: Buffer }>({
  dataType: () => 'longblob',
  toDriver: (value) => Buffer.from(value.buffer, value.byteOffset, value.byteLength),
  fromDriver: (value) => new Uint8Array(value),
});

/** UTC with milliseconds. */
export const moment = (name: string) => datetime(name, { fsp: 3, mode: 'date' });

/** Fixed-length ISO letters such as a revision's. */
export const letterColumn = (name: string) => char(name, { length: 4 });

/**
 * A JSON object or array that is checked with `schema` on its way out. The driver hands MariaDB's JSON back parsed;
 * top-level strings are therefore not supported (they would be ambiguous).
 */
export function jsonColumn<S extends z.ZodType>(name: string, schema: S) {
  return customType<{ data: z.output<S>; driverData: unknown }>({
    dataType: () => 'json',
    toDriver: (value) => JSON.stringify(value),
    fromDriver: (value) => schema.parse(typeof value === 'string' ? JSON.parse(value) : value),
  })(name);
}
