import * as Y from 'yjs';

/** Layout version of the stored sheet; raised with every migration. */
export const schemaVersion = 1;

/** A plain JSON value as one key of a stored record holds it. */
export type FlatValue = number | string | boolean | null | readonly FlatValue[] | { readonly [key: string]: FlatValue };

/** One stored record: flat keys, so that two people changing different properties of one part both keep their change. */
export type FlatRecord = Readonly<Record<string, FlatValue>>;

/** Top-level maps whose entries are records by id. */
export const collectionNames = ['parts', 'wires', 'junctions', 'scenarios', 'holdPoints'] as const;
export type CollectionName = (typeof collectionNames)[number];

/** The stored sheet as plain data: what migrations rewrite and repairs read. */
export interface StoredSheet {
  readonly collections: Readonly<Record<CollectionName, Readonly<Record<string, FlatRecord>>>>;
  /** `model:<name>` and `subcircuit:<name>`, whole JSON values of the netlist's types. */
  readonly library: FlatRecord;
  /** `schema` (number) and `title` (text). */
  readonly meta: FlatRecord;
}

export type RecordMap = Y.Map<FlatValue>;

export function collectionOf(doc: Y.Doc, name: CollectionName): Y.Map<RecordMap> {
  return doc.getMap<RecordMap>(name);
}

export function libraryOf(doc: Y.Doc): Y.Map<FlatValue> {
  return doc.getMap<FlatValue>('library');
}

export function metaOf(doc: Y.Doc): Y.Map<FlatValue> {
  return doc.getMap<FlatValue>('meta');
}

/**
 * Every shared type of a sheet: the scope of undo, and what observers watch. Call it before applying updates:
 * a type first asked for afterwards is another object than the one the transaction names.
 */
export function sharedTypesOf(doc: Y.Doc): (Y.Map<RecordMap> | Y.Map<FlatValue>)[] {
  return [...collectionNames.map((name) => collectionOf(doc, name)), libraryOf(doc), metaOf(doc)];
}

/** A stored record ready to be put into its collection. */
export const recordMapOf = (flat: FlatRecord): RecordMap => new Y.Map(Object.entries(flat));
