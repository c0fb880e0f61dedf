import { expect, type Locator, type Page } from '@playwright/test';

/** A circuit's sheet in a browser, in the words of the screen. */
export class CircuitPage {
  constructor(readonly page: Page) {}

  get margin(): Locator {
    return this.page.getByRole('complementary', { name: 'Margin' });
  }

  get ladder(): Locator {
    return this.page.getByRole('slider', { name: 'Shown at hold point' });
  }

  /** Entries of the margin that say all of `words`. */
  entry(...words: (string | RegExp)[]): Locator {
    return words.reduce<Locator>((found, one) => found.filter({ hasText: one }), this.margin.getByRole('article'));
  }

  part(ref: string): Locator {
    return this.page.locator(`[aria-roledescription="part"][aria-label^="${ref},"], [aria-roledescription="part"][aria-label="${ref}"]`);
  }

  /** Selects a part by the mouse, at its middle: the canvas itself takes pointer events. */
  async select(ref: string): Promise<void> {
    const box = await this.part(ref).first().boundingBox();
    if (!box) throw new Error(`${ref} is not in view.`);
    await this.page.mouse.click(box.x + box.width / 2, box.y + box.height / 2);
  }

  /** From the bench home to the circuit's sheet, checked to the end. */
  async open(title: string): Promise<void> {
    await this.page.goto('/benches');
    await this.page.getByRole('link', { name: title }).first().click();
    await this.checked();
  }

  async checked(): Promise<void> {
    // On a phone the margin is another pane.
    await expect(this.page.getByText(/\d+ checks on [^,]+, \d/).first()).toBeAttached({ timeout: 90_000 });
  }

  async saved(): Promise<void> {
    await expect(this.page.getByRole('contentinfo').getByText(/^Saved/)).toBeVisible({ timeout: 30_000 });
  }

  async showAt(volts: string, key: 'Home' | 'End'): Promise<void> {
    await this.ladder.focus();
    await this.page.keyboard.press(key);
    await expect(this.ladder).toHaveAttribute('aria-valuetext', new RegExp(volts));
  }
}
