import demoCheck from '@/components/landing/demo-check.json';
import { LandingPage } from '@/components/landing/landing-page';
import type { LandingPicture } from '@/components/landing/landing-picture';
import { demoHref } from '@/lib/http/demo-link';
import { pageCaller } from '@/lib/http/page-caller';
import { draw } from '@/db/seed/draw';
import { inductionHeaterDriver } from '@/db/seed/induction-heater-driver';

let part = 0;
/** The drawing of the picture: fixed ids, so that it is the same in every process. */
const sheet = draw(inductionHeaterDriver, () => `demo-${String((part += 1)).padStart(3, '0')}`);

export default async function Page() {
  const caller = await pageCaller();
  return <LandingPage sheet={sheet} check={demoCheck as LandingPicture} demoHref={await demoHref()} signedIn={caller.person !== null} />;
}
