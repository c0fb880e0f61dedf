import { CircuitPage } from './support/circuit-page';
import { expect, expectNoAxeViolations, test } from './support/test';

const title = 'Induction-heater driver, low-voltage proof stage';

test.describe.configure({ mode: 'serial' });

test('from a blank gate to a signed-off revision, by a maker, a reviewer and a mentor', async ({ signedIn }) => {
  test.setTimeout(300_000);
  const maker = new CircuitPage((await signedIn('maker')).page);
  const reviewer = new CircuitPage((await signedIn('reviewer')).page);

  await test.step('the margin shows the stop of the floating gate', async () => {
    await maker.open(title);
    await expect(maker.entry('Stop', /Q1/, /no DC path|gate/i).first()).toBeVisible();
    await expectNoAxeViolations(maker.page);
    await reviewer.open(title);
  });

  await test.step('the maker takes the proposed change and the stop clears; the reviewer sees the part', async () => {
    const floating = maker.entry('Stop', /Q1/, /gate/i).first();
    await floating.getByRole('button').first().click();
    await floating.getByRole('button', { name: 'Take it' }).click();
    await expect(maker.entry('Stop', /Q1/, /no DC path/i)).toHaveCount(0);
    await maker.saved();
    await expect(reviewer.page.getByText('22 kΩ').nth(1)).toBeVisible();
    await expect(reviewer.page.getByRole('list', { name: 'On the sheet' }).getByRole('img', { name: /Ines/ })).toBeVisible();
  });

  await test.step('the reviewer writes a note on R1; it appears at the maker', async () => {
    await reviewer.select('R1');
    await reviewer.margin.getByRole('button', { name: 'New note' }).click();
    await reviewer.page.getByLabel('What should the makers see').fill('Is R1 still right at 325 V?');
    await reviewer.page.getByRole('button', { name: 'Write it' }).click();
    await expect(maker.entry('Is R1 still right at 325 V?')).toBeVisible();
  });

  await test.step('at the top of the ladder the indicator is a stop that was none at the bottom', async () => {
    await maker.showAt('15 V', 'Home');
    await maker.showAt('325 V', 'End');
    await expect(maker.entry('Stop', /R1|D1/).first()).toBeVisible();
    await expect(maker.page.getByRole('region', { name: 'Cautions' })).toBeVisible();
  });

  await test.step('the maker cuts a revision and asks for review', async () => {
    await maker.page.getByRole('button', { name: /^Cut revision/ }).first().click();
    await maker.page.getByLabel('What changed, for the reviewers').fill('22 kΩ from gate to source.');
    await maker.page.getByRole('alertdialog').getByRole('button', { name: /^Cut [A-Z]$/ }).click();
    await expect(maker.page).toHaveURL(/\/revisions\/[A-Z]\/ask$/, { timeout: 60_000 });
    await maker.page.getByRole('button', { name: /^Ask for review of/ }).click();
    await expect(maker.page).toHaveURL(/\/revisions\/[A-Z]$/);
  });

  const revision = /(\/circuits\/[^/]+\/revisions\/([A-Z]))$/.exec(new URL(maker.page.url()).pathname);
  const [path = '', letter = ''] = revision?.slice(1) ?? [];

  await test.step('the mentor signs it off up to the first hold point and is refused above, with the reason', async () => {
    const { page } = await signedIn('mentor');
    await page.goto(`${path}/sign`);
    await expect(page.getByRole('heading', { name: /Refused above 15 V/ })).toBeVisible();
    await expectNoAxeViolations(page);
    const form = page.locator('form').filter({ has: page.getByRole('heading', { name: /Sign-off, revision/ }) });
    await form.getByLabel(/I have read the sheet/).check();
    await form.getByRole('button', { name: new RegExp(`Sign off ${letter} to 15 V`) }).click();
    await page.goto(path);
    await expect(page.getByText(/signed off to 15 V/i).filter({ visible: true }).first()).toBeVisible();
  });

  await test.step('an edit makes a draft that no sign-off covers; the revision stays signed', async () => {
    await maker.page.goto(path.replace(/\/revisions\/.*$/, ''));
    await maker.checked();
    await maker.select('TP1');
    await maker.page.keyboard.press('Delete');
    await maker.saved();
    await expect(maker.page.getByText(/draft,? after/i).filter({ visible: true }).first()).toBeVisible();
    await maker.page.goto(path);
    await expect(maker.page.getByText(/signed off to 15 V/i).filter({ visible: true }).first()).toBeVisible();
  });
});
