import { useState, type FormEvent } from 'react'
import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { TextField } from '#components/ui/field.tsx'
import { fieldError, messageOf } from '#lib/api-error.ts'
import { formText } from '#lib/form-text.ts'
import { signIn } from '../api/session.ts'

export const SignInForm = ({ onDone }: { readonly onDone: () => void }) => {
  const [busy, setBusy] = useState(false)
  const [error, setError] = useState<unknown>(null)

  const submit = async (form: FormData) => {
    setBusy(true)
    setError(null)
    try {
      await signIn({ email: formText(form, 'email'), password: formText(form, 'password') })
      onDone()
    } catch (failure) {
      setError(failure)
      setBusy(false)
    }
  }
  const onSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    void submit(new FormData(event.currentTarget))
  }

  const email = fieldError(error, '/email')
  const password = fieldError(error, '/password')
  return (
    <form onSubmit={onSubmit} noValidate className="flex flex-col gap-4">
      {error && !email && !password ? (
        <Band tone="error" live="alert">
          {messageOf(error)}
        </Band>
      ) : null}
      <TextField label="E-mail" name="email" type="email" autoComplete="username" required error={email} />
      <TextField
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        required
        error={password}
      />
      <div className="pt-2">
        <Button type="submit" look="main" busy={busy} className="w-full">
          Sign in
        </Button>
      </div>
    </form>
  )
}
