/** Net quantities of one run, as measured: length [m], finished area [m²], pieces; null where it has none. */
export type NetQuantities = { length: number | null; area: number | null; count: number | null };

/**
 * Sum of net quantities, exact to the last bit that a double can hold (Neumaier's compensated sum), so that the order
 * of the runs changes nothing a reader could print. Nothing is rounded.
 *
 * @returns null in a column where no run has a quantity
 * @source A. Neumaier, Zeitschrift für Angewandte Mathematik und Mechanik 54 (1974) 39
 */
export function sumOfNet(quantities: readonly NetQuantities[]): NetQuantities {
  return {
    length: exactSum(quantities.map(({ length }) => length)),
    area: exactSum(quantities.map(({ area }) => area)),
    count: exactSum(quantities.map(({ count }) => count)),
  };
}

/** The compensated sum of the values that are there; null when none is. */
export function exactSum(values: readonly (number | null)[]): number | null {
  const numbers = values.filter((value) => value !== null);
  if (numbers.length === 0) return null;
  let sum = 0;
  let lost = 0;
  for (const value of numbers) {
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}
