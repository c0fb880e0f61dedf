'use client';
import { useState, type FormEvent } from 'react';
import { ApiProblem, callApi, wordsOf } from '@/components/query/api';
import { Button } from '@/components/ui/button';
import { Mark } from '@/components/ui/mark';
import { signInSchema, whoSchema } from '@/lib/schemas/session';

interface Wrong {
  readonly email?: string;
  readonly password?: string;
  readonly form?: string;
}

const input = 'my-1.5 mr-3 h-[42px] min-w-0 flex-1 rounded-key border bg-film px-3 text-lg text-ink max-tablet:h-target';

/** Signs in and goes on to where the person came from. A wrong address and a wrong password are answered alike. */
export function SignInForm({ to }: { readonly to: string }) {
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [seen, setSeen] = useState(false);
  const [busy, setBusy] = useState(false);
  const [wrong, setWrong] = useState<Wrong>({});

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (busy) return;
    const parsed = signInSchema.safeParse({ email, password });
    if (!parsed.success) {
      const of = (field: string) => parsed.error.issues.find((issue) => issue.path[0] === field)?.message;
      setWrong({ email: of('email'), password: of('password') });
      return;
    }
    setBusy(true);
    setWrong({});
    try {
      await callApi('/api/session', { method: 'POST', body: parsed.data, answer: whoSchema });
      window.location.assign(to);
    } catch (error) {
      const { title, detail } = wordsOf(error);
      setWrong({ form: error instanceof ApiProblem && error.code === 'sign-in-failed' ? `${title} Check both and try again.` : `${title} ${detail}` });
      setBusy(false);
    }
  };

  const row = 'flex min-h-14 flex-wrap items-center border-t border-ink';
  const legend = 'silk w-[104px] flex-none pl-5 text-xs text-ink-2';
  const error = (id: string, words: string | undefined) => (words ? (
    <p id={id} role="alert" className="flex w-full gap-1.5 pr-3 pb-2.5 pl-5 text-sm text-stop-ink tablet:pl-[104px]"><Mark kind="stop" size={16} silent />{words}</p>
  ) : null);

  return (
    <form onSubmit={(event) => void submit(event)} noValidate aria-labelledby="sign-in-title" className="w-[522px] border-[1.5px] border-ink bg-film text-ink max-tablet:w-full">
      <div className="px-5 pt-[22px] pb-[18px]">
        <h1 id="sign-in-title" className="font-cond text-[38px] leading-[1.05] font-semibold tracking-[.01em]">Sign in</h1>
        <p className="mt-1.5 text-body text-ink-2">Then to the bench.</p>
      </div>
      <div className={row}>
        <label htmlFor="email" className={legend}>E-mail</label>
        <input id="email" name="email" type="email" inputMode="email" autoComplete="username" autoCapitalize="none" spellCheck={false} autoFocus value={email} onChange={(event) => setEmail(event.target.value)} aria-invalid={Boolean(wrong.email)} aria-describedby={wrong.email ? 'email-wrong' : undefined} className={`${input} ${wrong.email ? 'border-stop' : 'border-edge'}`} />
        {error('email-wrong', wrong.email)}
      </div>
      <div className={row}>
        <label htmlFor="password" className={legend}>Password</label>
        <input id="password" name="password" type={seen ? 'text' : 'password'} autoComplete="current-password" value={password} onChange={(event) => setPassword(event.target.value)} aria-invalid={Boolean(wrong.password)} aria-describedby={wrong.password ? 'password-wrong' : undefined} className={`${input} ${wrong.password ? 'border-stop' : 'border-edge'}`} />
        <Button tone="flat" className="mr-2" aria-pressed={seen} onClick={() => setSeen(!seen)}>{seen ? 'Hide' : 'Show'}</Button>
        {error('password-wrong', wrong.password)}
      </div>
      <div className={`${row} gap-x-4 gap-y-2 px-5 py-3.5`}>
        <Button type="submit" tone="primary" size="large" busy={busy}>Sign in</Button>
        {wrong.form ? <p role="alert" className="flex min-w-0 flex-1 gap-1.5 text-sm text-stop-ink"><Mark kind="stop" size={16} silent />{wrong.form}</p> : null}
      </div>
      <div className="flex min-h-11 border-t border-ink">
        <div className="flex-[2] px-5 py-[7px]"><p className="silk text-ink-2">Title</p><p className="text-body font-medium">Sign in</p></div>
        <div className="flex-1 border-l border-ink px-5 py-[7px]"><p className="silk text-ink-2">Sheet</p><p className="text-body font-medium">1 of 1</p></div>
      </div>
    </form>
  );
}
