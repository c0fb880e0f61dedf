import type { Finding, Severity } from '@/lib/netlist/findings/finding';
import type { FileReport } from './check-file';

const severities: readonly Severity[] = ['stop', 'caution', 'advice'];
const headings: Readonly<Record<Severity, string>> = { stop: 'Stop', caution: 'Caution', advice: 'Advice' };
const width = 96;

/** Words wrapped at 96 columns behind an indent. */
function wrapped(words: string, indent: string): string {
  const lines: string[] = [];
  let line = '';
  for (const word of words.split(' ')) {
    if (line !== '' && `${indent}${line} ${word}`.length > width) {
      lines.push(line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return [...lines, line].map((one) => `${indent}${one}`).join('\n');
}

function findingWords(finding: Finding, number: number): string {
  const crossing = finding.evidence.find(({ quantity }) => quantity === 'crossing');
  const from = crossing && typeof crossing.value === 'number' ? ` (from ${Number(crossing.value.toPrecision(3))} V)` : '';
  const head = `  ${number}. ${finding.message}${from}`;
  const remedy = finding.remedy ? `\n${wrapped(finding.remedy.words, '     → ')}` : '';
  return `${wrapped(head.trimStart(), '  ').replace(/\n {2}/g, '\n     ')}${remedy}\n     ${finding.rule}, ${finding.refs.join(', ')}`;
}

function listed(heading: string, lines: readonly string[]): readonly string[] {
  return lines.length === 0 ? [] : [`${heading} (${lines.length})`, ...lines, ''];
}

/** A report for people: grouped by severity, numbered through, plain text without colour codes. */
export function fileWords({ file, findings, undetermined, errors, notices }: FileReport): string {
  const ordered = severities.flatMap((severity) => findings.filter((finding) => finding.severity === severity));
  const groups = severities.flatMap((severity) => listed(headings[severity], ordered
    .flatMap((finding, index) => (finding.severity === severity ? [findingWords(finding, index + 1)] : []))));
  const at = (line: number): string => (line > 0 ? `line ${line}: ` : '');
  const count = (severity: Severity): number => findings.filter((finding) => finding.severity === severity).length;
  return [
    file, '',
    ...listed('Errors', errors.map(({ line, reason }) => wrapped(`${at(line)}${reason}`, '  '))),
    ...groups,
    ...listed('Undetermined', undetermined.map(({ message }) => wrapped(message, '  '))),
    ...listed('Notices', notices.map(({ line, text }) => wrapped(`${at(line)}${text}`, '  '))),
    `${count('stop')} stop, ${count('caution')} caution, ${count('advice')} advice, ${undetermined.length} undetermined`, '',
  ].join('\n');
}
