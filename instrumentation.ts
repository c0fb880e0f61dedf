/** Starts what runs beside requests in the web process: the server's own checks of sheets, and tidying. */
export async function register(): Promise<void> {
  const { startBackground } = await import('@/lib/http/background');
  startBackground();
}
