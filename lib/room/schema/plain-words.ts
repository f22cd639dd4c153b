import { z } from 'zod';

const nouns: Readonly<Record<string, string>> = {
  number: 'a number',
  string: 'text',
  boolean: 'true or false',
  array: 'a list',
  tuple: 'a list',
  object: 'an object',
  record: 'an object',
  null: 'null',
};

function nounOf(value: unknown): string {
  if (value === null) return 'null';
  if (Array.isArray(value)) return 'a list';
  if (typeof value === 'number' && !Number.isFinite(value)) return 'a number without end';
  return nouns[typeof value] ?? typeof value;
}

const counted = (origin: string): string =>
  origin === 'array' ? ' entries' : origin === 'string' ? ' characters' : '';

/** What people read where a schema has no words of its own. */
function inPlainWords(issue: z.core.$ZodRawIssue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      return issue.input === undefined
        ? 'Is missing'
        : `Must be ${nouns[issue.expected] ?? issue.expected}, not ${nounOf(issue.input)}`;
    case 'too_small':
      return counted(issue.origin)
        ? `Must have ${issue.minimum}${counted(issue.origin)} or more`
        : `Must be ${issue.inclusive ? `${issue.minimum} or more` : `more than ${issue.minimum}`}`;
    case 'too_big':
      return counted(issue.origin)
        ? `Must have ${issue.maximum}${counted(issue.origin)} or fewer`
        : `Must be ${issue.inclusive ? `${issue.maximum} or less` : `less than ${issue.maximum}`}`;
    case 'invalid_value':
      return `Must be ${issue.values.length > 1 ? 'one of: ' : ''}${issue.values.join(', ')}`;
    case 'invalid_key':
      return 'Cannot be called that: use letters, digits, hyphens and underscores';
    default:
      return undefined;
  }
}

z.config({ customError: inPlainWords });
