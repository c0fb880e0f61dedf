'use client';
import { memo } from 'react';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet } from '@/lib/document/records';
import { netWords } from '@/lib/netlist/connectivity/net-words';
import { spokenItems } from '@/lib/editor/spoken/part-spoken';

interface TwinTablesProps {
  readonly sheet: Sheet;
  /** Chooses a part from the table, as a press on its symbol does. */
  readonly onSelect: (partId: string) => void;
}

/** The sheet as tables, for screen readers: parts with what they join, nets with their pins. Always in the page, never in view. */
export const TwinTables = memo(function TwinTables({ sheet, onSelect }: TwinTablesProps) {
  const spoken = spokenItems(sheet);
  const netlist = sheetToNetlist(sheet);
  const notes = sheet.parts.filter((part) => part.kind === 'note');
  return (
    <section aria-label="The sheet as tables" className="sr-only">
      <table>
        <caption>Parts</caption>
        <thead><tr><th scope="col">Part</th><th scope="col">Pins and nets</th></tr></thead>
        <tbody>
          {netlist.parts.map((part) => (
            <tr key={part.id}>
              <th scope="row"><button type="button" onClick={() => onSelect(part.id)}>{spoken.get(part.id) ?? part.ref}</button></th>
              <td>{Object.entries(part.pins).map(([pin, net]) => `${pin} ${netWords(netlist, net, part.ref)}`).join(', ')}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <table>
        <caption>Nets</caption>
        <thead><tr><th scope="col">Net</th><th scope="col">Pins</th></tr></thead>
        <tbody>{netlist.nets.map((net) => <tr key={net.name}><th scope="row">{netWords(netlist, net.name)}</th><td>{net.pins.join(', ')}</td></tr>)}</tbody>
      </table>
      {notes.length === 0 ? null : <ul aria-label="Notes on the sheet">{notes.map((note) => <li key={note.id}>{String(note.facts.text ?? '')}</li>)}</ul>}
    </section>
  );
});
