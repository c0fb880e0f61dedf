import { createHash, randomBytes } from 'node:crypto';

/** 128 random bits, base64url (22 characters): shown once, stored as its SHA-256. */
export const newToken = (): string => randomBytes(16).toString('base64url');

export const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex');
