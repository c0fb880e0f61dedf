'use client';
import { useRouter } from 'next/navigation';
import { callApi } from '@/components/query/api';
import { Icon } from '@/components/ui/icon';
import { Initials } from '@/components/ui/initials';
import { Menu } from '@/components/ui/menu';

interface AccountMenuProps {
  readonly person: { readonly name: string; readonly email: string };
  /** Links that stand in the bar at larger widths. */
  readonly phone?: boolean;
}

/** Who is signed in, their sessions, and the way out. */
export function AccountMenu({ person, phone = false }: AccountMenuProps) {
  const router = useRouter();
  const signOut = async () => {
    await callApi('/api/session', { method: 'DELETE', answer: null }).catch(() => undefined);
    router.push('/sign-in');
    router.refresh();
  };
  return (
    <Menu
      label={`Account of ${person.name}`}
      openerClassName="grid place-items-center min-h-[30px] max-tablet:size-target"
      opener={phone ? <Icon name="bars" className="size-5" /> : <Initials name={person.name} size="large" />}
      heading={<><p className="text-body font-semibold">{person.name}</p><p className="text-sm text-ink-2">{person.email}</p></>}
      items={[
        { key: 'sessions', words: <><Icon name="person" />Where I am signed in</>, onSelect: () => router.push('/account/sessions') },
        { key: 'out', words: <><Icon name="out" />Sign out</>, onSelect: () => void signOut() },
      ]}
    />
  );
}
