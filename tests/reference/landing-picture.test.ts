import { expect, it } from 'vitest';
import stored from '@/components/landing/demo-check.json';
import { landingPicture } from '@/components/landing/landing-picture';
import { draw } from '@/db/seed/draw';
import { inductionHeaterDriver } from '@/db/seed/induction-heater-driver';
import { checkNetlist } from '@/lib/check/check-netlist';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import { createNodeEngine } from '@/lib/spice/node-engine';

it('the picture on the landing page says what the checks say of the demo circuit', async () => {
  const engine = createNodeEngine();
  try {
    let next = 0;
    const sheet = draw(inductionHeaterDriver, () => `demo-${String((next += 1)).padStart(3, '0')}`);
    const fresh = landingPicture(await checkNetlist(sheetToNetlist(sheet), { engine }), '325 V');
    const told = (picture: typeof fresh) => picture.findings.map(({ rule, severity, refs, message, fromVolts }) => ({ rule, severity, refs, message, fromVolts }));
    expect(told(stored as typeof fresh)).toEqual(told(fresh));
    for (const [net, volts] of Object.entries(fresh.volts)) expect((stored as typeof fresh).volts[net], net).toBeCloseTo(volts, 1);
  } finally {
    await engine.dispose();
  }
});
