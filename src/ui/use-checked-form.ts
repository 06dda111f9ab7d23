import { useState, type FormEvent } from 'react';
import type { z } from 'zod';
import { checkForm } from '../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../lib/field-messages.ts';
import { useFocusOnWrong } from './use-focus-on-wrong.ts';

/**
 * A form that is held against the schema of its request before `send` is called, with the first wrong field in focus after a try.
 * `send` takes what the server finds wrong in the same way.
 */
export function useCheckedForm<T>(
  schema: z.ZodType<T>,
  entered: unknown,
  send: (value: T, told: { readonly onError: (error: unknown) => void }) => void,
) {
  const [wrong, setWrong] = useState<FieldMessages>({});
  const form = useFocusOnWrong(wrong);
  function submit(event: FormEvent) {
    event.preventDefault();
    const checked = checkForm(schema, entered);
    setWrong(checked.ok ? {} : checked.fields);
    if (checked.ok) send(checked.value, { onError: (error) => setWrong(fieldMessagesOf(error)) });
  }
  return { form, wrong, submit };
}
