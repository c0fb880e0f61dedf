import { writeFileSync } from 'node:fs';
import { landingPicture } from '@/components/landing/landing-picture';
import { draw } from '@/db/seed/draw';
import { inductionHeaterDriver } from '@/db/seed/induction-heater-driver';
import { checkNetlist } from '@/lib/check/check-netlist';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import { createNodeEngine } from '@/lib/spice/node-engine';

/** Writes what the checks say of the demo circuit, for the picture on the landing page. A reference test compares it with the checks. */
const engine = createNodeEngine();
let next = 0;
const sheet = draw(inductionHeaterDriver, () => `demo-${String((next += 1)).padStart(3, '0')}`);
const picture = landingPicture(await checkNetlist(sheetToNetlist(sheet), { engine }), '325 V');
writeFileSync('components/landing/demo-check.json', `${JSON.stringify(picture, null, 2)}\n`);
await engine.dispose();
