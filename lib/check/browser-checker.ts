import { createBrowserEngine } from '@/lib/spice/browser-engine';
import { LiveChecker, type LiveFindings } from './live-checker';

/** A live checker on an engine of this page. The engine is fetched at the first sheet that needs numbers. */
export function openBrowserChecker(tell: (findings: LiveFindings) => void): { readonly checker: LiveChecker; readonly dispose: () => void } {
  const engine = createBrowserEngine();
  return { checker: new LiveChecker(engine, tell), dispose: () => void engine.dispose() };
}
