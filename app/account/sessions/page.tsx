import type { Metadata } from 'next';
import { SessionList } from '@/components/account/session-list';
import { QueryProvider } from '@/components/query/query-provider';
import { AccountMenu } from '@/components/shell/account-menu';
import { ThemeToggle } from '@/components/shell/theme-toggle';
import { TopBar } from '@/components/shell/top-bar';
import { ButtonLink } from '@/components/ui/button-link';
import { pagePerson } from '@/lib/http/page-caller';

export const metadata: Metadata = { title: 'Where I am signed in' };

export default async function SessionsPage() {
  const { person } = await pagePerson('/account/sessions');
  return (
    <div className="flex min-h-full flex-col">
      <TopBar brandHref="/benches"><ThemeToggle /><AccountMenu person={person} /></TopBar>
      <main className="flex-1 bg-film p-8 text-ink max-tablet:p-4">
        <div className="max-w-[640px]">
          <h1 className="font-cond text-2xl font-semibold">Where I am signed in</h1>
          <p className="mt-1 mb-4 text-body text-ink-2">A session ends after 12 hours without use, and after 30 days in any case. Signing wants one of the last 12 hours.</p>
          <QueryProvider><SessionList /></QueryProvider>
          <ButtonLink href="/benches" className="mt-6" icon="back">To the bench</ButtonLink>
        </div>
      </main>
    </div>
  );
}
