import type { PointEngine } from '@/lib/netlist/engine-deck/engine-port';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist } from '@/lib/netlist/netlist';
import { ruleRegistry } from '@/lib/netlist/rules/registry';
import { PointCache } from './caching-engine';
import { checkNetlist, type CheckResult } from './check-netlist';
import { checkTopology } from './check-topology';
import { voltsByHoldPoint, type NetVolts } from './net-volts';

export interface LiveFindings {
  /** Of all outcomes; one for each fingerprint. */
  readonly findings: readonly Finding[];
  readonly volts: NetVolts;
  /** `topology`: the engine has not answered for this sheet yet; `failed`: it could not. */
  readonly state: 'topology' | 'complete' | 'failed';
  /** Milliseconds since 1970. */
  readonly at: number;
}

const byTopology: ReadonlySet<string> = new Set(ruleRegistry.filter((rule) => rule.needs === 'topology').map((rule) => rule.id));

/**
 * Checks a sheet as it changes: what topology decides at once, the rest when the engine answers. Only one full check runs;
 * sheets that come meanwhile replace each other, so that the last one is always checked and nothing piles up.
 */
export class LiveChecker {
  private readonly cache = new PointCache();
  private running = false;
  private next: Netlist | null = null;
  private newest = '';
  private last: { readonly findings: readonly Finding[]; readonly volts: NetVolts } = { findings: [], volts: {} };

  constructor(
    private readonly engine: PointEngine,
    private readonly tell: (findings: LiveFindings) => void,
    private readonly check: (netlist: Netlist, engine: PointEngine, cache: PointCache) => Promise<CheckResult> = (netlist, engine_, cache) => checkNetlist(netlist, { engine: engine_, cache }),
  ) {}

  /** Takes the sheet's netlist; one that says the same as the last costs nothing. */
  take(netlist: Netlist): void {
    const content = JSON.stringify(netlist);
    if (content === this.newest) return;
    this.newest = content;
    const kept = this.last.findings.filter((finding) => !byTopology.has(finding.rule));
    this.tell({ findings: [...checkTopology(netlist), ...kept], volts: this.last.volts, state: 'topology', at: Date.now() });
    this.next = netlist;
    if (!this.running) void this.run();
  }

  private async run(): Promise<void> {
    this.running = true;
    while (this.next) {
      const netlist = this.next;
      this.next = null;
      try {
        const { findings, points } = await this.check(netlist, this.engine, this.cache);
        this.last = { findings, volts: voltsByHoldPoint(points) };
        if (!this.next) this.tell({ ...this.last, state: 'complete', at: Date.now() });
      } catch {
        if (!this.next) this.tell({ findings: checkTopology(netlist), volts: {}, state: 'failed', at: Date.now() });
      }
    }
    this.running = false;
  }
}
