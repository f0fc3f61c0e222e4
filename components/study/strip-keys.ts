/** Where a key leads from one thickness: to its neighbour, or to an end; null: the key is not for the strip. */
export function placeAfter(key: string, { at, count }: { at: number; count: number }): number | null {
  if (count === 0) return null;
  if (key === 'Home') return 0;
  if (key === 'End') return count - 1;
  if (key === 'ArrowRight' || key === 'ArrowDown') return Math.min(at + 1, count - 1);
  if (key === 'ArrowLeft' || key === 'ArrowUp') return Math.max(at - 1, 0);
  return null;
}
