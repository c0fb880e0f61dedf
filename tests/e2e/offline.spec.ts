import { CircuitPage } from './support/circuit-page';
import { Drawing } from './support/drawing';
import { expect, test } from './support/test';

test('edits made without a network are kept here, said so at once, and sent when the line is back', async ({ signedIn, baseURL, forgiven }) => {
  forgiven.push(/ERR_INTERNET_DISCONNECTED/);
  const { page, context } = await signedIn('maker');
  const me = await (await context.request.get('/api/session')).json() as { readonly benches: readonly { readonly slug: string }[] };
  const made = await context.request.post(`/api/benches/${me.benches[0]?.slug}/circuits`, {
    data: { title: `Offline by a test ${Date.now()}`, deck: 'Offline\nV1 vcc 0 12\nR1 vcc 0 1k\n.end\n' },
    headers: { origin: new URL(baseURL ?? '').origin, 'sec-fetch-site': 'same-origin' },
  });
  const { id } = await made.json() as { readonly id: string };
  await page.goto(`/circuits/${id}`);
  const circuit = new CircuitPage(page);
  const sheet = new Drawing(page);
  await circuit.checked();

  await context.setOffline(true);
  await circuit.select('R1');
  const field = sheet.form.getByLabel('Resistance');
  await field.fill('4k7');
  await field.press('Enter');
  await expect(page.getByRole('contentinfo')).toContainText('Not saved: offline, kept here', { timeout: 3_000 });
  await expect(page.getByRole('contentinfo')).toContainText('1 edit, sent when the line is back');

  await context.setOffline(false);
  await circuit.saved();
  await page.reload();
  await expect(sheet.part('R1')).toHaveAttribute('aria-label', /^R1, 4\.7.kΩ/);
});

test('what is no part of a sheet is not pasted, and the reason stands in the foot', async ({ signedIn, baseURL }) => {
  const { page, context } = await signedIn('maker');
  await context.grantPermissions(['clipboard-read', 'clipboard-write'], { origin: new URL(baseURL ?? '').origin });
  await new CircuitPage(page).open('Induction-heater');
  await page.evaluate(() => navigator.clipboard.writeText('hello'));
  await new Drawing(page).canvas.focus();
  await page.keyboard.press('Control+v');
  await expect(page.getByRole('contentinfo')).toContainText('no part of a sheet');
});
