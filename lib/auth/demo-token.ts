import { createHmac } from 'node:crypto';

/**
 * The guest token behind the landing page's 'open this circuit': 128 bits worked out from the installation's own secret, so that it
 * can be handed to visitors while the table keeps only its SHA-256.
 */
export function demoToken(secret: string, circuitId: string): string {
  return createHmac('sha256', secret).update(`guest link of the demo circuit ${circuitId}`).digest().subarray(0, 16).toString('base64url');
}
