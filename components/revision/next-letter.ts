/** A to Z, then AA: the letter after the newest. */
export function nextLetter(letters: readonly string[]): string {
  const newest = letters.toSorted((one, other) => one.length - other.length || one.localeCompare(other)).at(-1);
  if (!newest) return 'A';
  const head = newest.slice(0, -1);
  const last = newest.charCodeAt(newest.length - 1);
  if (last < 'Z'.charCodeAt(0)) return `${head}${String.fromCharCode(last + 1)}`;
  return head === '' ? 'AA' : `${nextLetter([head])}A`;
}
