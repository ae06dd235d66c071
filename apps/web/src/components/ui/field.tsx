import {
  useId,
  type InputHTMLAttributes,
  type ReactNode,
  type SelectHTMLAttributes,
  type TextareaHTMLAttributes,
} from 'react'

const control =
  'w-full border border-rule bg-sheet text-ink placeholder:text-pencil aria-invalid:border-fault aria-invalid:border-2 read-only:bg-paper disabled:text-pencil'

interface Shell {
  readonly label: string
  readonly hint?: ReactNode
  readonly error?: string | null | undefined
}

interface Ids {
  readonly id: string
  readonly described: string | undefined
}

const FieldShell = ({ label, hint, error, children }: Shell & { readonly children: (ids: Ids) => ReactNode }) => {
  const id = useId()
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ') || undefined
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="text-cell font-semibold">
        {label}
      </label>
      {children({ id, described })}
      {hint ? (
        <p id={`${id}-hint`} className="text-cell text-pencil">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} className="text-cell font-medium text-fault">
          {error}
        </p>
      ) : null}
    </div>
  )
}

export const TextField = ({
  label,
  hint,
  error,
  className = '',
  ...rest
}: Shell & InputHTMLAttributes<HTMLInputElement>) => (
  <FieldShell label={label} hint={hint} error={error}>
    {({ id, described }) => (
      <input
        {...rest}
        id={id}
        aria-describedby={described}
        aria-invalid={error ? true : undefined}
        className={`${control} h-8 px-2 ${className}`}
      />
    )}
  </FieldShell>
)

export const TextArea = ({
  label,
  hint,
  error,
  className = '',
  ...rest
}: Shell & TextareaHTMLAttributes<HTMLTextAreaElement>) => (
  <FieldShell label={label} hint={hint} error={error}>
    {({ id, described }) => (
      <textarea
        {...rest}
        id={id}
        aria-describedby={described}
        aria-invalid={error ? true : undefined}
        className={`${control} min-h-20 resize-y px-2 py-1.5 ${className}`}
      />
    )}
  </FieldShell>
)

export const SelectField = ({
  label,
  hint,
  error,
  className = '',
  children,
  ...rest
}: Shell & SelectHTMLAttributes<HTMLSelectElement>) => (
  <FieldShell label={label} hint={hint} error={error}>
    {({ id, described }) => (
      <select
        {...rest}
        id={id}
        aria-describedby={described}
        aria-invalid={error ? true : undefined}
        className={`${control} h-8 px-1.5 ${className}`}
      >
        {children}
      </select>
    )}
  </FieldShell>
)

export const CheckField = ({
  label,
  className = '',
  ...rest
}: { readonly label: ReactNode } & InputHTMLAttributes<HTMLInputElement>) => (
  <label className={`flex min-h-6 items-start gap-2 ${className}`}>
    <input {...rest} type="checkbox" className="mt-0.5 size-4 shrink-0 accent-steel" />
    <span>{label}</span>
  </label>
)
