import * as z from 'zod/mini';

const missing = 'This is still missing.';
const unreadable = 'We could not read this.';

/**
 * The sentence a person reads where a schema gives none of its own. Both sides use it: the API
 * when it parses a request, the web when it checks a form, so that one mistake reads alike.
 */
export const humanMessage: z.core.$ZodErrorMap = (issue) => {
  switch (issue.code) {
    case 'invalid_type':
      return isMissing(issue.input) ? missing : (typeSentences[issue.expected] ?? unreadable);
    case 'too_small':
      return smallSentence(issue.origin, Number(issue.minimum), issue.inclusive ?? true);
    case 'too_big':
      return bigSentence(issue.origin, Number(issue.maximum), issue.inclusive ?? true);
    case 'invalid_value':
      return isMissing(issue.input) ? 'Choose one.' : 'Choose one of those offered.';
    case 'invalid_format':
      return formatSentences[issue.format] ?? unreadable;
    case 'unrecognized_keys':
      return `We do not know ${issue.keys.map((key) => `“${key}”`).join(', ')}.`;
    case 'not_multiple_of':
      return `Write a multiple of ${issue.divisor}.`;
    case 'invalid_union':
      return isMissing(issue.input) ? missing : unreadable;
    default:
      return unreadable;
  }
};

/** Makes `humanMessage` the default of every schema in this process or page; call it once. */
export function installMessages(): void {
  z.config({ customError: humanMessage });
}

function isMissing(input: unknown): boolean {
  return input === undefined || input === null || input === '';
}

const typeSentences: Readonly<Record<string, string>> = {
  string: 'Write this as text.',
  number: 'Write this as a number.',
  int: 'Write this as a whole number.',
  boolean: 'Say yes or no.',
  array: 'A list belongs here.',
  tuple: 'A list belongs here.',
  object: 'Several answers belong here.',
  record: 'Several answers belong here.',
  date: 'Choose a day.',
  file: 'Choose a file.',
};

const formatSentences: Readonly<Record<string, string>> = {
  date: 'Choose a day from the calendar.',
  datetime: 'Write a date and time.',
  email: 'Write the address like name@example.com.',
  url: 'Write a web address.',
};

function smallSentence(origin: string, minimum: number, inclusive: boolean): string {
  switch (origin) {
    case 'string':
      return minimum === 1 ? missing : `At least ${characters(minimum)}, please.`;
    case 'array':
    case 'set':
      return minimum === 1 ? 'Choose at least one.' : `Choose at least ${grouped(minimum)}.`;
    default:
      return inclusive ? `At least ${grouped(minimum)}.` : `More than ${grouped(minimum)}.`;
  }
}

function bigSentence(origin: string, maximum: number, inclusive: boolean): string {
  switch (origin) {
    case 'string':
      return `At most ${characters(maximum)}, please.`;
    case 'array':
    case 'set':
      return `At most ${grouped(maximum)}.`;
    default:
      return inclusive ? `At most ${grouped(maximum)}.` : `Less than ${grouped(maximum)}.`;
  }
}

function characters(count: number): string {
  return `${grouped(count)} ${count === 1 ? 'character' : 'characters'}`;
}

/** 10000 as 10,000; without `Intl`, which is large to load and slow to start. */
function grouped(figure: number): string {
  return String(figure).replace(/\B(?=(\d{3})+$)/g, ',');
}
