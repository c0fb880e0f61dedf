import { account, expect, test } from './support/test';

test('a maker signs in by the form, with a cookie that no script reads', async ({ stranger }) => {
  const { page } = await stranger();
  const { email, password } = account('maker');
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(/\/b\/|\/benches\//);
  expect((await page.context().cookies()).every((cookie) => cookie.httpOnly || cookie.name === 'theme')).toBe(true);
});

test('a wrong password is told plainly, and what was typed stays', async ({ stranger, forgiven }) => {
  forgiven.push(/status of 401/);
  const { page } = await stranger();
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(account('maker').email);
  await page.getByLabel('Password').fill('not this one');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('main').getByRole('alert')).toBeVisible();
  await expect(page.getByLabel('E-mail')).toHaveValue(account('maker').email);
});

test('a page of the bench sends a stranger to sign in, and back', async ({ stranger }) => {
  const { page } = await stranger();
  const { email, password } = account('reviewer');
  await page.goto('/account/sessions');
  await expect(page).toHaveURL(/\/sign-in\?to=/);
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).not.toHaveURL(/sign-in/);
});
