import { useEffect, useRef, useState } from 'react';
import type { z } from 'zod';
import { ApiError } from '../../../lib/apiClient';

type Errors<Values> = Partial<Record<keyof Values, string>>;

interface AuthForm<Values, S extends z.ZodType> {
  schema: S;
  initial: Values;
  send: (body: z.output<S>) => Promise<void>;
  /** Puts an answer beside the field it speaks of; what has no field is said above the button. */
  place: (error: ApiError) => Errors<Values> | null;
}

/** A small controlled form: checked by the contract's schema, sent once at a time, nothing typed is lost. */
export function useAuthForm<Values extends object, S extends z.ZodType>({
  schema,
  initial,
  send,
  place,
}: AuthForm<Values, S>) {
  const [values, setValues] = useState(initial);
  const [errors, setErrors] = useState<Errors<Values>>({});
  const [formError, setFormError] = useState('');
  const [busy, setBusy] = useState(false);
  const form = useFocusOnFirstError(errors);

  const submit = async () => {
    if (busy) return;
    setFormError('');
    const parsed = schema.safeParse(values);
    if (!parsed.success) return setErrors(firstIssues<Values>(parsed.error));
    setErrors({});
    setBusy(true);
    try {
      await send(parsed.data);
    } catch (error) {
      const placed = error instanceof ApiError ? ofThisForm(place(error), initial) : {};
      if (Object.keys(placed).length > 0) setErrors(placed);
      else setFormError(error instanceof ApiError ? error.message : 'That did not work. Try again.');
    } finally {
      setBusy(false);
    }
  };

  const set = <K extends keyof Values>(field: K, value: Values[K]) => {
    setValues((now) => ({ ...now, [field]: value }));
    setErrors((now) => ({ ...now, [field]: undefined }));
  };
  return { form, values, errors, formError, busy, set, submit };
}

/** What speaks of a field that isn't here would be seen by nobody. */
function ofThisForm<Values extends object>(errors: Errors<Values> | null, initial: Values): Errors<Values> {
  const known = Object.entries(errors ?? {}).filter(([field, message]) => field in initial && message);
  return Object.fromEntries(known) as Errors<Values>;
}

function firstIssues<Values>(error: z.ZodError): Errors<Values> {
  const found: Errors<Values> = {};
  for (const issue of error.issues) found[issue.path[0] as keyof Values] ??= issue.message;
  return found;
}

/** Whoever can't see the red rule lands on the field that needs them. */
function useFocusOnFirstError(errors: object) {
  const form = useRef<HTMLFormElement>(null);
  const count = Object.values(errors).filter(Boolean).length;
  useEffect(() => {
    if (count > 0) form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus();
  }, [count]);
  return form;
}
