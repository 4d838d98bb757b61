'use client';

import { useId, type ComponentProps, type ReactNode } from 'react';
import { classes } from './classes';

interface FieldAria {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
  required: true | undefined;
}

interface FieldProps {
  label: ReactNode;
  /** What belongs in it, in a sentence; stands before any error. */
  hint?: ReactNode;
  /** The server's or the form's sentence about this field. */
  error?: string | undefined;
  required?: boolean;
  className?: string;
  children: (aria: FieldAria) => ReactNode;
}

/** A labelled control with its hint and its error tied to it. */
export function Field({ label, hint, error, required = false, className, children }: FieldProps) {
  const id = useId();
  const described = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(
    (part) => part !== null,
  );
  return (
    <div className={classes('flex min-w-0 flex-col gap-1', className)}>
      <label htmlFor={id} className="font-semibold">
        {label}
        {!required && <span className="font-normal text-slate"> (optional)</span>}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-slate">
          {hint}
        </p>
      )}
      {children({
        id,
        'aria-describedby': described.length > 0 ? described.join(' ') : undefined,
        'aria-invalid': error ? true : undefined,
        required: required ? true : undefined,
      })}
      {error && (
        <p id={`${id}-error`} className="border-l-2 border-umber pl-2 font-semibold text-umber">
          {error}
        </p>
      )}
    </div>
  );
}

const CONTROL =
  'w-full min-w-0 rounded border border-slate bg-leaf px-2 py-1 text-ink placeholder:text-slate ' +
  'aria-invalid:border-umber aria-invalid:border-2 disabled:opacity-60';

export function Input({ className, ...rest }: ComponentProps<'input'>) {
  return <input {...rest} className={classes(CONTROL, 'min-h-9', className)} />;
}

export function Textarea({ className, ...rest }: ComponentProps<'textarea'>) {
  return <textarea rows={3} {...rest} className={classes(CONTROL, className)} />;
}

/** The browser's own list: it works by keyboard, by voice and on a phone without help. */
export function Select({ className, ...rest }: ComponentProps<'select'>) {
  return <select {...rest} className={classes(CONTROL, 'min-h-9', className)} />;
}
