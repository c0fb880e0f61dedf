/** Lets at most `perSecond` through in any second, counted from the first of them. */
export class RateGate {
  private from = 0;
  private passed = 0;

  constructor(private readonly perSecond: number, private readonly now: () => number = Date.now) {}

  pass(): boolean {
    const now = this.now();
    if (now - this.from >= 1_000) {
      this.from = now;
      this.passed = 0;
    }
    this.passed += 1;
    return this.passed <= this.perSecond;
  }
}
