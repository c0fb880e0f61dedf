import type * as Y from 'yjs';
import { codecs, type RecordOf } from './codecs/codec-table';
import type { Decoded } from './codecs/codec';
import type { Sheet } from './records';
import type { Repair } from './repair/repair';
import { readLibrary } from './repair/repair-library';
import { repairPlan } from './repair/repair-plan';
import { repairWires } from './repair/repair-wires';
import { collectionNames, collectionOf, libraryOf, metaOf, sharedTypesOf, type CollectionName, type FlatRecord, type RecordMap } from './stored-sheet';

type Cache = { [Name in CollectionName]: Map<string, Decoded<RecordOf[Name]>> };

/** One reader for the whole life of a document: after a change it parses only the records that changed. */
export class SheetReader {
  private readonly cache: Cache = { parts: new Map(), wires: new Map(), junctions: new Map(), scenarios: new Map(), holdPoints: new Map() };

  constructor(private readonly doc: Y.Doc) {
    sharedTypesOf(doc);
  }

  /** Forgets the records that a transaction touched. Call it before reading again. */
  forget(transaction: Y.Transaction): void {
    for (const name of collectionNames) {
      const collection = collectionOf(this.doc, name);
      for (const [type, keys] of transaction.changed) {
        if ((type as unknown) === collection) keys.forEach((key) => key !== null && this.cache[name].delete(key));
        else if ((type.parent as unknown) === collection && type._item?.parentSub) this.cache[name].delete(type._item.parentSub);
      }
    }
  }

  /** Forgets every record: when transactions may have gone unseen. */
  forgetAll(): void {
    for (const name of collectionNames) this.cache[name].clear();
  }

  read(): { readonly sheet: Sheet; readonly repairs: readonly Repair[] } {
    const repairs: Repair[] = [];
    const parts = this.collect('parts', repairs);
    const wiring = repairWires(parts, this.collect('wires', repairs), this.collect('junctions', repairs));
    const plan = repairPlan(parts, this.collect('scenarios', repairs), this.collect('holdPoints', repairs));
    const library = readLibrary(libraryOf(this.doc).toJSON() as FlatRecord);
    const title = metaOf(this.doc).get('title');
    repairs.push(...wiring.wires.repairs, ...wiring.junctions.repairs, ...plan.scenarios.repairs, ...plan.holdPoints.repairs, ...library.repairs);
    return {
      sheet: {
        title: typeof title === 'string' ? title : '',
        parts, wires: wiring.wires.kept, junctions: wiring.junctions.kept,
        scenarios: plan.scenarios.kept, holdPoints: plan.holdPoints.kept,
        models: library.models, subcircuits: library.subcircuits,
      },
      repairs,
    };
  }

  /** Sound records of a collection in order of their ids. */
  private collect<Name extends CollectionName>(name: Name, repairs: Repair[]): RecordOf[Name][] {
    const cache = this.cache[name] as Map<string, Decoded<RecordOf[Name]>>;
    const records: RecordOf[Name][] = [];
    const stored = collectionOf(this.doc, name);
    for (const id of [...stored.keys()].sort()) {
      let decoded = cache.get(id);
      if (!decoded) {
        decoded = codecs[name].fromFlat(id, flatOf(stored.get(id))) as Decoded<RecordOf[Name]>;
        cache.set(id, decoded);
      }
      if (decoded.ok) records.push(decoded.record);
      else repairs.push({ collection: name, id, reason: decoded.reason });
    }
    return records;
  }
}

/** A stored record as plain data; anything but a map (a foreign client wrote it) reads as an empty record. */
export function flatOf(stored: RecordMap | undefined): FlatRecord {
  return typeof stored?.toJSON === 'function' ? stored.toJSON() as FlatRecord : {};
}
