/** "P09" before "P10", "Q2" before "Q10": as a person counts. */
export const byLabel = (a: { label: string }, b: { label: string }): number =>
  a.label.localeCompare(b.label, 'en', { numeric: true });

/** What the next row is called: the number at the end of the last one goes on, with as many digits. */
export function nextLabel(rows: readonly { label: string }[]): string {
  const last = [...rows].sort(byLabel).at(-1)?.label ?? '';
  const [, word = '', digits] = /^(.*?)(\d+)$/.exec(last) ?? [];
  return digits ? `${word}${String(Number(digits) + 1).padStart(digits.length, '0')}` : '';
}
