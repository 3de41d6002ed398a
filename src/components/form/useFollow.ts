import { useEffect, useRef } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useUnits } from '../../app/useUnits.ts';
import { written, type Written } from './written.ts';

/**
 * Lets a number field follow a computed value until somebody writes their own. Answers whether it
 * still follows.
 */
export function useFollow(name: string, computed: number | null): boolean {
  const units = useUnits();
  const { control, getValues, setValue } = useFormContext();
  const now = useWatch({ control, name }) as Written;
  const lastText = useRef<string | null>(null);
  useEffect(() => {
    const field = getValues(name) as Written;
    const isFree =
      field.text.trim() === '' ? lastText.current === null : field.text === lastText.current;
    if (computed === null || !isFree) return;
    const next = written(field.kind, computed, units);
    lastText.current = next.text;
    if (next.text !== field.text) setValue(name, next, { shouldValidate: false });
  }, [computed, getValues, name, setValue, units]);
  return (
    computed !== null && now.text !== '' && now.text === written(now.kind, computed, units).text
  );
}
