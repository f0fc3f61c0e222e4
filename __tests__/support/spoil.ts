type Path = (string | number)[];
type Json = null | boolean | number | string | Json[] | { [key: string]: Json };

/** A deep copy as JSON would carry it. */
export const asJson = (value: object): Json => JSON.parse(JSON.stringify(value));

/** Every value inside that is no list and no object, by its path; what was typed beside a value is left out. */
export function leavesOf(value: Json, path: Path = []): { path: Path; value: Json }[] {
  if (value === null || typeof value !== 'object') return [{ path, value }];
  const inside = Array.isArray(value) ? [...value.entries()] : Object.entries(value);
  return inside.filter(([key]) => key !== 'typed').flatMap(([key, part]) => leavesOf(part, [...path, key]));
}

/** A copy with one value put in another's place; undefined takes it away. */
export function spoilt(value: Json, [key, ...rest]: Path, bad: Json | undefined): Json {
  if (key === undefined) throw new Error('A path has a first step');
  if (Array.isArray(value)) {
    return value.map((part, index) => (index === key ? deeper(part, rest, bad) : part));
  }
  if (value === null || typeof value !== 'object') throw new Error('A path leads through lists and objects');
  const { [key]: part, ...others } = value;
  const put = deeper(part ?? null, rest, bad);
  return put === undefined ? others : { ...others, [key]: put };
}

// undefined inside a list becomes null
function deeper(part: Json, rest: Path, bad: Json | undefined): Json;
function deeper(part: Json, rest: Path, bad: Json | undefined) {
  return rest.length === 0 ? bad : spoilt(part, rest, bad);
}

/** What cannot stand where this value stands, whatever the field. */
export function badFor(value: Json): [what: string, bad: Json | undefined][] {
  const always: [string, Json | undefined][] = [
    ['an object', { $gt: '' }],
    ['a list', [1]],
  ];
  if (typeof value === 'number') {
    const texts = ['NaN', 'Infinity', '12', '1e400'];
    return [...always, ...texts.map((text): [string, Json] => [text, text]), ['missing', undefined], ['huge', 1e300]];
  }
  if (typeof value === 'boolean') return [...always, ['text', 'yes'], ['missing', undefined]];
  if (typeof value === 'string') {
    const long = 'x'.repeat(10_001);
    return [
      ...always,
      ['a number', 12345],
      ['missing', undefined],
      ['10,001 characters', long],
      ['a null byte', `a\0b`],
      ['half a surrogate pair', `a\uD800b`],
    ];
  }
  return always;
}
