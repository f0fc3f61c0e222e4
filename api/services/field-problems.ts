import { AppError } from '@/api/errors';

/** What is wrong with an input, by the path of the field. */
export type Fields = Record<string, string>;

/** @throws AppError `invalid-input` when any field has a message */
export function refuse(fields: Fields): void {
  if (Object.keys(fields).length > 0) throw new AppError('invalid-input', undefined, { fields });
}

/** The same messages, for an input that stands inside another. */
export const under = (path: string, fields: Fields): Fields =>
  Object.fromEntries(Object.entries(fields).map(([field, message]) => [`${path}.${field}`, message]));

/** A list of ids that must be known, each named once. */
export function listFields(path: string, ids: readonly string[], known: ReadonlySet<string>): Fields {
  const fields: Fields = {};
  ids.forEach((id, index) => {
    if (!known.has(id)) fields[`${path}.${index}`] = 'Not known here';
    else if (ids.indexOf(id) < index) fields[`${path}.${index}`] = 'Named twice';
  });
  return fields;
}
