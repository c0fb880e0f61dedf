/** A count with its noun: '1 stop', '2 stops', '0 cautions'. */
export function counted(count: number, noun: string, plural = `${noun}s`): string {
  return `${count} ${count === 1 ? noun : plural}`;
}
