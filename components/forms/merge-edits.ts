type Branch = Record<string, unknown>;

/**
 * Two people's edits of one row in one: where only they changed something, theirs; everywhere else, mine.
 * Lists and quantities are taken whole, since half of one and half of another says what nobody meant.
 */
export function mergeEdits<Values>(base: Values, mine: Values, theirs: Values): Values;
export function mergeEdits(base: unknown, mine: unknown, theirs: unknown): unknown {
  if (isSame(base, mine)) return theirs;
  if (!isBranch(base) || !isBranch(mine) || !isBranch(theirs)) return mine;
  const merged = Object.keys(mine).map((key) => [key, mergeEdits(base[key], mine[key], theirs[key])]);
  return Object.fromEntries(merged);
}

const isBranch = (value: unknown): value is Branch =>
  typeof value === 'object' && value !== null && !Array.isArray(value) && !('value' in value);

/** Whether two values say the same, in whatever order their members stand. */
export function isSame(one: unknown, other: unknown): boolean {
  if (Object.is(one, other)) return true;
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null) return false;
  const [a, b] = [entries(one), entries(other)];
  return a.size === b.size && [...a].every(([key, value]) => b.has(key) && isSame(value, b.get(key)));
}

const entries = (value: object) => new Map(Object.entries(value).filter(([, part]) => part !== undefined));
