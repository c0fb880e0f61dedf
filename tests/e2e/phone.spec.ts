import { CircuitPage } from './support/circuit-page';
import { expect, expectNoAxeViolations, test } from './support/test';

const title = 'Induction-heater driver, low-voltage proof stage';
const underReview = 'Kiln interlock relay driver, 12 V';

test('on a phone a reviewer reads the margin, jumps to a part, writes, replies and resolves', async ({ signedIn }) => {
  test.setTimeout(180_000);
  const { page } = await signedIn('reviewer', { phone: true });
  const circuit = new CircuitPage(page);
  await circuit.open(title);
  const panes = page.getByRole('navigation', { name: 'Drawing or margin' });
  const body = `Read on a phone ${Date.now()}`;

  await test.step('an entry is chosen by a touch on its words, and its locator leads to the drawing', async () => {
    await panes.getByRole('button', { name: /^Margin/ }).tap();
    const first = circuit.margin.getByRole('article').first();
    await first.getByRole('heading').tap();
    await expect(page).toHaveURL(/#(finding|note)-/);
    await expectNoAxeViolations(page);
    const locator = first.getByRole('button', { name: /zone/i });
    const box = await locator.boundingBox();
    expect(Math.min(box?.width ?? 0, box?.height ?? 0)).toBeGreaterThanOrEqual(44);
    await locator.tap();
    await expect(panes.getByRole('button', { name: /^Drawing/ })).toHaveAttribute('aria-pressed', 'true');
  });

  await test.step('a deep link opened fresh shows the entry in the margin', async () => {
    await page.reload();
    await circuit.checked();
    await expect(panes.getByRole('button', { name: /^Margin/ })).toHaveAttribute('aria-pressed', 'true');
    await expect(circuit.margin.locator('article').filter({ has: page.locator('[aria-expanded="true"]') })).toBeVisible();
  });

  await test.step('a note is written, answered and resolved with the thumb', async () => {
    await circuit.margin.getByRole('button', { name: 'New note' }).tap();
    await page.getByLabel('What should the makers see').fill(body);
    await page.getByRole('button', { name: 'Write it' }).tap();
    const note = circuit.entry(body);
    await expect(note).toBeVisible();
    await expect(note.locator('[aria-expanded="true"]')).toBeVisible();
    await note.getByRole('textbox').fill('And answered.');
    await note.getByRole('button', { name: 'Send' }).tap();
    await expect(note).toContainText('And answered.');
    await note.getByRole('button', { name: 'Resolve' }).tap();
    await expect(note.getByText('resolved', { exact: true })).toBeVisible();
  });
});

test('on a phone a mentor signs on a page of its own', async ({ signedIn }) => {
  const { page } = await signedIn('mentor', { phone: true });
  await page.goto('/benches');
  const sheet = await page.getByRole('link', { name: underReview }).first().getAttribute('href');
  await page.goto(`${sheet}/revisions/A/sign`);
  const sign = page.getByRole('button', { name: /^Sign off A/ });
  await expect(sign).toHaveAttribute('aria-disabled', 'true');
  await expect(page.getByText('Not yet: say that you have read it')).toBeVisible();
  await page.getByLabel(/I have read the sheet/).check();
  await expectNoAxeViolations(page);
  await sign.tap();
  await expect(page.getByText(/signed off to/i).filter({ visible: true }).first()).toBeVisible();
});

test('a guest opens the demo from the landing page: hazard shown, nothing to write, initials only', async ({ stranger }) => {
  const { page } = await stranger();
  await page.goto('/');
  await page.getByRole('link', { name: 'Open this circuit' }).first().click();
  await expect(page).toHaveURL(/\/circuits\//);
  const margin = page.getByRole('complementary', { name: 'Margin' });
  await expect(margin.getByRole('article').first()).toBeVisible();
  await expect(margin.getByRole('button', { name: 'New note' })).toHaveCount(0);
  await expect(page.getByText('Ines Okafor')).toHaveCount(0);
  await expect(page.getByRole('slider', { name: 'Shown at hold point' })).toHaveAttribute('aria-valuetext', /325 V/);
  await expect(page.getByRole('img', { name: /^Schematic, revision/ }).getByText('325 V').first()).toBeVisible();
  await expectNoAxeViolations(page);
});
