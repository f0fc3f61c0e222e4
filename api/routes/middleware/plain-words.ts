import type { z } from 'zod';

type Issue = z.core.$ZodIssue;

const kinds: Record<string, string> = {
  string: 'Must be text',
  number: 'Must be a number',
  int: 'Must be a whole number',
  boolean: 'Must be yes or no',
  array: 'Must be a list',
  object: 'Must have parts',
  date: 'Must be a date',
};
// zod's own sentences begin like this; a contract's are kept as they are
const jargon = /^(Invalid|Too |Unrecognized|Expected)/;

/** What is wrong, in plain words: a contract's own message, else one made from the kind of the fault. */
export function messageOf(issue: Issue): string {
  if (!jargon.test(issue.message)) return issue.message;
  if (issue.code === 'invalid_type') return wrongKind(issue);
  if (issue.code === 'too_small') return tooSmall(issue);
  if (issue.code === 'too_big') return tooBig(issue);
  if (issue.code === 'invalid_value') return `Must be ${oneOf(issue.values.map(String))}`;
  if (issue.code === 'unrecognized_keys') return `Holds what is not known: ${issue.keys.join(', ')}`;
  if (issue.code === 'invalid_format') return `Must be ${formats[issue.format] ?? 'written otherwise'}`;
  return 'Is not right';
}

function wrongKind({ expected, message }: z.core.$ZodIssueInvalidType): string {
  if (message.includes('received undefined')) return 'Must be filled in';
  return kinds[expected] ?? 'Is of the wrong kind';
}

const oneOf = (values: readonly string[]) => (values.length === 1 ? '' : 'one of ') + values.join(', ');

const formats: Record<string, string> = {
  uuid: 'a known id',
  email: 'an e-mail address',
  datetime: 'a date and time',
  date: 'a date',
  url: 'a web address',
};

function tooSmall({ origin, minimum, inclusive }: z.core.$ZodIssueTooSmall): string {
  if (origin === 'string') return minimum === 1 ? 'Must be filled in' : `At least ${minimum} characters`;
  if (origin === 'array') return `At least ${minimum} of them`;
  return inclusive === false ? `Must be more than ${minimum}` : `Must be at least ${minimum}`;
}

function tooBig({ origin, maximum, inclusive }: z.core.$ZodIssueTooBig): string {
  if (origin === 'string') return `At most ${maximum} characters`;
  if (origin === 'array') return `At most ${maximum} of them`;
  return inclusive === false ? `Must be less than ${maximum}` : `Must be at most ${maximum}`;
}
