/** Which copies of a sheet are open in this browser, over all its tabs: those hold a lock of their name. */
export interface OpenCopies {
  /** Marks a copy as open until the returned function is called or the page ends. */
  hold(instance: string): () => void;
  /** Says which copies are open now. */
  list(): Promise<ReadonlySet<string>>;
}

const prefix = 'holdoff-copy ';

/** Web Locks: a tab that crashed holds none. */
export function lockedCopies(locks: LockManager): OpenCopies {
  return {
    hold(instance) {
      let release = (): void => {};
      const held = new Promise<void>((resolve) => { release = resolve; });
      void locks.request(prefix + instance, () => held);
      return release;
    },
    async list() {
      const { held = [] } = await locks.query();
      return new Set(held.flatMap(({ name }) => (name?.startsWith(prefix) ? [name.slice(prefix.length)] : [])));
    },
  };
}

/** Without Web Locks, and in tests: every copy that was not closed here counts as left behind. */
export function noLocks(): OpenCopies {
  const open = new Set<string>();
  return {
    hold(instance) {
      open.add(instance);
      return () => open.delete(instance);
    },
    list: async () => new Set(open),
  };
}
