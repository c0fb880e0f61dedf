import type { Metadata } from 'next';
import { ThemeToggle } from '@/components/shell/theme-toggle';
import { TopBar } from '@/components/shell/top-bar';
import { SignInDrawing } from '@/components/sign-in/sign-in-drawing';
import { SignInForm } from '@/components/sign-in/sign-in-form';
import { SheetFrame } from '@/components/ui/sheet-frame';
import { returnPath } from '@/lib/schemas/return-path';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage({ searchParams }: { readonly searchParams: Promise<{ to?: string | string[] }> }) {
  const { to } = await searchParams;
  return (
    <div className="flex min-h-full flex-col">
      <TopBar><ThemeToggle /></TopBar>
      <main className="flex flex-1 flex-col bg-film text-ink">
        <SheetFrame columns={8} rows={5}>
          <SignInDrawing />
          <p className="absolute bottom-3 left-6 max-w-[420px] bg-film px-2 py-1 text-md text-ink-2 max-wide:hidden">Mentors sign with this name. Do not share a login: a sign-off must say who gave it.</p>
          <div className="mt-auto -mr-px -mb-px self-end max-tablet:mt-0 max-tablet:w-full max-tablet:self-stretch"><SignInForm to={returnPath(typeof to === 'string' ? to : null)} /></div>
        </SheetFrame>
      </main>
    </div>
  );
}
