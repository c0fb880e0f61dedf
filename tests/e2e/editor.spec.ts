import { CircuitPage } from './support/circuit-page';
import { Drawing, steps } from './support/drawing';
import { expect, expectNoAxeViolations, test } from './support/test';

test('a sheet is drawn by keys and mouse, seen by another as it grows, and survives a reload', async ({ signedIn, baseURL }) => {
  test.setTimeout(300_000);
  const { page, context } = await signedIn('maker');
  const me = await (await context.request.get('/api/session')).json() as { readonly benches: readonly { readonly slug: string }[] };
  const made = await context.request.post(`/api/benches/${me.benches[0]?.slug}/circuits`, {
    data: { title: `Drawn by a test ${Date.now()}` }, headers: { origin: new URL(baseURL ?? '').origin, 'sec-fetch-site': 'same-origin' },
  });
  const { id } = await made.json() as { readonly id: string };
  await page.goto(`/circuits/${id}`);
  const sheet = new Drawing(page);
  const circuit = new CircuitPage(page);

  await test.step('an empty sheet says the next step and offers it', async () => {
    await expect(page.getByRole('heading', { name: 'Put the supply down first' })).toBeVisible();
    await expectNoAxeViolations(page);
    await page.getByRole('button', { name: 'Add a part', exact: true }).click();
    await page.keyboard.press('Enter');
    await expect(sheet.part('V1')).toBeVisible();
  });

  await test.step('parts are placed by keys alone and wired with the mouse', async () => {
    await sheet.place('resis', 'R1', ['.', ...steps(20, 0)]);
    await sheet.wire(['V1', '+'], ['R1', '1']);
    await sheet.wire(['V1', '-'], ['R1', '2']);
    await expect(sheet.part('R1')).toHaveAttribute('aria-label', /from V1:\+ to V1:-/);
    await circuit.saved();
  });

  const { page: others } = await signedIn('reviewer');
  const seen = new Drawing(others);
  await test.step('another person sees the parts, the cursor, and no tools to change them', async () => {
    await others.goto(`/circuits/${id}`);
    await expect(seen.part('R1')).toBeVisible();
    await expect(others.getByRole('complementary', { name: 'Parts' })).toHaveCount(0);
    const at = await sheet.pin('R1', '1');
    await page.mouse.move(at.x + 40, at.y + 40, { steps: 3 });
    await expect(others.locator('[data-person="IO"]')).toBeAttached();
  });

  await test.step('a quantity with the wrong unit is refused with the reason, the old value stays, and the series is offered', async () => {
    await circuit.select('R1');
    const field = sheet.form.getByLabel('Resistance');
    await field.fill('1k2');
    await field.press('Enter');
    await expect(seen.part('R1')).toHaveAttribute('aria-label', /^R1, 1\.2.kΩ/);
    await field.fill('33 kV');
    await field.press('Enter');
    await expect(sheet.form.getByRole('alert')).toContainText('kV is a voltage');
    await expect(sheet.form.getByRole('alert')).toContainText(/R1 stays at 1\.2.kΩ/);
    await expectNoAxeViolations(page);
    await sheet.form.getByRole('button', { name: /^33.kΩ$/ }).click();
    await expect(seen.part('R1')).toHaveAttribute('aria-label', /^R1, 33.kΩ/);
  });

  await test.step('undo takes back one edit of one\'s own at a time', async () => {
    await sheet.canvas.focus();
    await page.keyboard.press('Control+z');
    await expect(seen.part('R1')).toHaveAttribute('aria-label', /^R1, 1\.2.kΩ/);
    await page.keyboard.press('Control+Shift+z');
    await expect(seen.part('R1')).toHaveAttribute('aria-label', /^R1, 33.kΩ/);
  });

  await test.step('a net is named where it is pressed, a part turned and moved with its wires', async () => {
    const at = await sheet.pin('R1', '1');
    await page.keyboard.press('3');
    await page.mouse.click(at.x, at.y);
    await page.getByLabel('Net name', { exact: true }).fill('RAIL');
    await page.keyboard.press('Enter');
    await expect(seen.part('R1')).toHaveAttribute('aria-label', /from RAIL to V1:-/);
    await page.keyboard.press('1');
    await circuit.select('R1');
    await sheet.canvas.focus();
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('.');
    await expect(seen.part('R1')).toHaveAttribute('aria-label', /from RAIL to V1:-/);
  });

  await test.step('what was drawn is there after a reload', async () => {
    await circuit.saved();
    await page.reload();
    await expect(sheet.part('R1')).toHaveAttribute('aria-label', /^R1, 33.kΩ, from RAIL to V1:-/);
    await expect(page.getByRole('button', { name: 'Undo' })).toHaveAttribute('aria-disabled', 'true');
  });
});

test('the power-up plan is typed as people write it and kept as one edit', async ({ signedIn, baseURL }) => {
  const { page, context } = await signedIn('maker');
  const me = await (await context.request.get('/api/session')).json() as { readonly benches: readonly { readonly slug: string }[] };
  const made = await context.request.post(`/api/benches/${me.benches[0]?.slug}/circuits`, {
    data: { title: `Planned by a test ${Date.now()}`, deck: 'Plan\nV1 vcc 0 12\nR1 vcc 0 1k\n.end\n' },
    headers: { origin: new URL(baseURL ?? '').origin, 'sec-fetch-site': 'same-origin' },
  });
  const { id } = await made.json() as { readonly id: string };
  await page.goto(`/circuits/${id}`);
  const circuit = new CircuitPage(page);
  await page.getByRole('button', { name: 'Set the plan' }).click();
  const plan = page.getByRole('form', { name: 'Power-up plan' });
  await plan.getByRole('button', { name: 'Add a hold point' }).click();
  await plan.getByLabel('Volts').fill('12 A');
  await plan.getByLabel('Current limit').fill('500m');
  await plan.getByRole('button', { name: 'Keep the plan' }).click();
  await expect(plan.getByRole('alert')).toContainText('A is a current');
  await plan.getByLabel('Volts').fill('12');
  await plan.getByLabel('Source').selectOption('V1');
  await plan.getByRole('button', { name: 'Keep the plan' }).click();
  await expect(plan).toHaveCount(0);
  await circuit.saved();
  await expect(circuit.ladder).toBeVisible();
  const kept = await (await context.request.get(`/api/circuits/${id}`)).json() as { readonly holdPoints: readonly object[] };
  expect(kept.holdPoints).toEqual([{ name: '12 V', volts: 12, amps: 0.5, source: 'V1' }]);
});
