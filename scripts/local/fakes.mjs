/**
 * A mailbox and a file store for one machine, so that nothing leaves it: SMTP that files each message under MAIL_FOLDER,
 * and S3 on FILES_FOLDER. Started by `npm start` only while PUBLIC_URL is a loopback address.
 */
import { startFileStore } from './file-store.mjs';
import { startMailbox } from './mailbox.mjs';

/** @type {(() => Promise<void>)[]} */
const stops = [];
if (process.env.MAIL_PORT) stops.push(await startMailbox(Number(process.env.MAIL_PORT), process.env.MAIL_FOLDER ?? ''));
if (process.env.FILES_PORT) stops.push(await startFileStore(Number(process.env.FILES_PORT), process.env.FILES_FOLDER ?? ''));

for (const signal of /** @type {const} */ (['SIGTERM', 'SIGINT'])) {
  process.once(signal, () => void Promise.allSettled(stops.map((stop) => stop())).then(() => process.exit(0)));
}
