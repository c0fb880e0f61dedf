import { z } from 'zod';

/** 128-bit random, base64url: 22 characters. */
export const guestTokenSchema = z.string().regex(/^[A-Za-z0-9_-]{22}$/);
