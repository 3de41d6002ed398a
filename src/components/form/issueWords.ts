import { get } from 'react-hook-form';
import type { z } from 'zod';
import { readerOf } from './readers.ts';
import { isWritten } from './written.ts';

/** An issue of a contract in words for its field: bounds in the unit that the field shows. */
export function issueWords(issue: z.core.$ZodIssue, values: unknown): string {
  const field: unknown = get(values, issue.path.join('.'));
  if (isWritten(field) && (issue.code === 'too_small' || issue.code === 'too_big')) {
    const bound = Number(issue.code === 'too_small' ? issue.minimum : issue.maximum);
    const reader = readerOf(field.kind, field.prefs);
    const text = `${reader.write(bound, undefined)} ${reader.unit}`.trim();
    return issue.code === 'too_small' ? `At least ${text}` : `At most ${text}`;
  }
  if (isWritten(field) && issue.code === 'invalid_type')
    return field.text.trim() === '' ? 'Write a number' : 'Write a whole number';
  if (issue.code === 'invalid_format' && issue.format === 'uuid') return 'Choose one of these';
  if (issue.code === 'invalid_type' || issue.code === 'invalid_union') return 'Fill this in';
  return issue.message;
}
