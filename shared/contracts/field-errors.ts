import type { z } from 'zod';
import type { FieldError } from './error-codes.ts';

type Issue = z.core.$ZodIssue;

/** What stands at a path of the input, short enough for a message. */
function gotAt(input: unknown, path: readonly PropertyKey[]): string {
  let at: unknown = input;
  for (const key of path)
    at = at !== null && typeof at === 'object' ? (at as Record<PropertyKey, unknown>)[key] : undefined;
  if (at === undefined) return 'nothing';
  const text = typeof at === 'number' ? String(at) : JSON.stringify(at);
  return text.length > 60 ? `${text.slice(0, 57)}…` : text;
}

const KINDS: Record<string, string> = {
  string: 'text',
  number: 'a number',
  boolean: 'true or false',
  array: 'a list',
  object: 'an object',
  int: 'a whole number',
};

/** What the field takes. Schemas whose message starts with "takes " speak for themselves. */
function takesOf(issue: Issue): string {
  if (issue.message.startsWith('takes ')) return issue.message.slice('takes '.length);
  switch (issue.code) {
    case 'invalid_type':
      return KINDS[issue.expected] ?? issue.expected;
    case 'invalid_value':
      return issue.values.map((v) => JSON.stringify(v)).join(' or ');
    case 'invalid_union':
      return 'discriminator' in issue && 'options' in issue && Array.isArray(issue.options)
        ? issue.options.map((v) => JSON.stringify(v)).join(' or ')
        : 'one of the forms that the format knows';
    case 'too_small':
      return issue.origin === 'string'
        ? issue.minimum === 1
          ? 'some text'
          : `at least ${issue.minimum} characters`
        : issue.origin === 'array'
          ? `at least ${issue.minimum} of them`
          : `${issue.inclusive ? 'at least' : 'more than'} ${issue.minimum}`;
    case 'too_big':
      return issue.origin === 'string'
        ? `at most ${issue.maximum} characters`
        : issue.origin === 'array'
          ? `at most ${issue.maximum} of them`
          : `${issue.inclusive ? 'at most' : 'less than'} ${issue.maximum}`;
    case 'unrecognized_keys':
      return 'only keys that the format knows';
    default:
      return issue.message;
  }
}

function one(path: readonly PropertyKey[], got: string, takes: string): FieldError {
  const where = path.map(String).join('.');
  return { path: where, got, takes, message: `${where === '' ? 'the whole' : where}: got ${got}, takes ${takes}` };
}

/** Every zod issue as a field error that says which field, what it got and what it takes. Unknown keys are named one by one. */
export function fieldErrors(error: z.ZodError, input: unknown): FieldError[] {
  return error.issues.flatMap((issue) =>
    issue.code === 'unrecognized_keys'
      ? issue.keys.map((key) => one([...issue.path, key], 'a key that is not known', 'only keys that the format knows'))
      : [one(issue.path, gotAt(input, issue.path), takesOf(issue))],
  );
}
