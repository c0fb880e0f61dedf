import { localStore } from '../local/local-store.mjs';
import { reachable } from '../parts/web-part.mjs';

/**
 * The environment of web, realtime and the programs beside them: what was given, and what this start decided.
 * @param {{ given: NodeJS.ProcessEnv, settings: import('./settings.mjs').Settings, ports: import('./ports.mjs').Ports,
 *   data: import('../data/data-folder.mjs').DataFolder, databaseUrl: string, internalSecret: string, build: string | undefined }} input
 * @returns {NodeJS.ProcessEnv}
 */
export function partEnvironment({ given, settings, ports, data, databaseUrl, internalSecret, build }) {
  return {
    ...given,
    NEXT_TELEMETRY_DISABLED: '1',
    AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
    HOST: settings.host,
    PORT: String(ports.web),
    PUBLIC_URL: ports.publicUrl,
    DATA_DIR: data.root,
    DATABASE_URL: databaseUrl,
    REALTIME_PORT: String(ports.realtime),
    REALTIME_INTERNAL_URL: given.REALTIME_INTERNAL_URL || `http://${reachable(settings.host)}:${ports.realtime}`,
    INTERNAL_SECRET: given.INTERNAL_SECRET || internalSecret,
    ...(build ? { HOLDOFF_DIST_DIR: build } : {}),
    ...(ports.mail ? { SMTP_URL: `smtp://127.0.0.1:${ports.mail}`, LOCAL_MAILBOX: data.mail } : {}),
    ...(ports.files ? {
      S3_ENDPOINT: `http://127.0.0.1:${ports.files}`, S3_BUCKET: localStore.bucket,
      S3_ACCESS_KEY_ID: localStore.accessKey, S3_SECRET_ACCESS_KEY: localStore.secretKey,
    } : {}),
  };
}
