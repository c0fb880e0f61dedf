/** Waits until `found` gives something other than undefined or false. @throws Error naming `what` after `timeout` ms */
export async function waitFor<T>(what: string, found: () => T | undefined | false | Promise<T | undefined | false>, timeout = 30_000): Promise<T> {
  const end = Date.now() + timeout;
  for (;;) {
    const value = await found();
    if (value !== undefined && value !== false) return value;
    if (Date.now() > end) throw new Error(`Waited ${timeout} ms for ${what}.`);
    await new Promise((resolve) => setTimeout(resolve, 5));
  }
}
