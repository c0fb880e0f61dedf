import { expect, type Locator, type Page } from '@playwright/test';

/** The canvas of a sheet in a browser: pins, parts and tools by the words of the screen. */
export class Drawing {
  constructor(readonly page: Page) {}

  get canvas(): Locator {
    return this.page.getByRole('application', { name: /^Schematic/ });
  }

  get form(): Locator {
    return this.page.locator('[data-form]');
  }

  part(ref: string): Locator {
    return this.page.locator(`[aria-roledescription="part"][aria-label^="${ref},"]`);
  }

  /** Middle of a pin on the screen. */
  async pin(ref: string, pin: string): Promise<{ readonly x: number; readonly y: number }> {
    const box = await this.part(ref).locator(`[data-handleid="${pin}"]`).boundingBox();
    if (!box) throw new Error(`${ref}:${pin} is not in view.`);
    return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
  }

  /** Places a part from the drawer by keys alone: search, take, move by `steps`, put down. */
  async place(search: string, ref: string, steps: readonly string[]): Promise<void> {
    await this.canvas.focus();
    await this.page.keyboard.press('0');
    await expect(this.page.getByLabel('Add a part', { exact: true })).toBeFocused();
    await this.page.keyboard.type(search);
    await this.page.keyboard.press('Enter');
    await expect(this.canvas).toBeFocused();
    for (const step of steps) await this.page.keyboard.press(step);
    await this.page.keyboard.press('Enter');
    await expect(this.part(ref)).toBeVisible();
  }

  /** Draws a wire between two pins with the mouse. */
  async wire(from: readonly [string, string], to: readonly [string, string]): Promise<void> {
    await this.page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: /^Wire/ }).click();
    const [a, b] = [await this.pin(...from), await this.pin(...to)];
    await this.page.mouse.click(a.x, a.y);
    await this.page.mouse.move(b.x, b.y, { steps: 4 });
    await this.page.mouse.click(b.x, b.y);
    await this.canvas.focus();
    await this.page.keyboard.press('1');
  }
}

const repeat = (key: string, times: number): readonly string[] => Array<string>(times).fill(key);

/** Arrow keys that move a part in hand by grid steps: right and down are positive. */
export function steps(right: number, down: number): readonly string[] {
  return [
    ...repeat(right < 0 ? 'ArrowLeft' : 'ArrowRight', Math.abs(right)),
    ...repeat(down < 0 ? 'ArrowUp' : 'ArrowDown', Math.abs(down)),
  ];
}
