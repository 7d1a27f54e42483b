import { type FormEvent, useEffect, useRef, useState } from 'react';
import { useSend } from '#renderer/api.ts';
import { Button, ErrorSummary, TextField } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { SignInInput } from '#shared/contracts/session.ts';
import { frontText } from '#shared/text/front.ts';

const text = frontText.signIn;

interface SignInFormProps {
  readonly next: string | null;
  readonly values: SignInInput;
  onChange(values: SignInInput): void;
}

export function SignInForm({ next, values, onChange }: SignInFormProps) {
  const [missing, setMissing] = useState<{ signIn?: string; password?: string }>({});
  const summary = useRef<HTMLDivElement>(null);
  const form = useRef<HTMLFormElement>(null);
  const change = useRef(onChange);
  useEffect(() => {
    // With bad reception people have typed before this script was there: that counts.
    const typed = (id: string) =>
      (form.current?.elements.namedItem(id) as HTMLInputElement | null)?.value ?? '';
    const early = { signIn: typed('sign-in'), password: typed('password') };
    if (early.signIn || early.password) change.current(early);
  }, []);
  const signIn = useSend(endpoints.signIn, {
    onDone: (answer) => window.location.assign(next ?? answer.next),
  });
  const problems = [
    ...(missing.signIn ? [{ fieldId: 'sign-in', message: missing.signIn }] : []),
    ...(missing.password ? [{ fieldId: 'password', message: missing.password }] : []),
    ...(signIn.isError ? [{ fieldId: 'sign-in', message: signIn.error.message }] : []),
  ];
  const count = problems.length;
  useEffect(() => {
    if (count > 0) {
      document.title = text.documentError;
      summary.current?.focus();
    }
  }, [count]);

  const submit = (event: FormEvent) => {
    event.preventDefault();
    const wrong = {
      ...(values.signIn.trim() ? {} : { signIn: text.nameMissing }),
      ...(values.password ? {} : { password: text.passwordMissing }),
    };
    setMissing(wrong);
    signIn.reset();
    if (!wrong.signIn && !wrong.password) signIn.mutate(values);
  };

  return (
    <form ref={form} onSubmit={submit} noValidate method="post" className="grid content-start gap-6">
      <h1 className="text-4xl font-bold">{text.title}</h1>
      {count > 0 && <ErrorSummary ref={summary} title={text.problemTitle} errors={problems} />}
      <TextField
        id="sign-in"
        label={text.name}
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        value={values.signIn}
        error={missing.signIn}
        onChange={(event) => onChange({ ...values, signIn: event.currentTarget.value })}
      />
      <TextField
        id="password"
        label={text.password}
        type="password"
        autoComplete="current-password"
        value={values.password}
        error={missing.password}
        onChange={(event) => onChange({ ...values, password: event.currentTarget.value })}
      />
      <div>
        <Button type="submit" disabled={signIn.isPending}>
          {signIn.isPending ? text.going : text.go}
        </Button>
      </div>
      <p className="text-ink-2">{text.help}</p>
    </form>
  );
}
