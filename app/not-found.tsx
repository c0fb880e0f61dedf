import type { Metadata } from 'next';
import { PlainPage } from '@/components/shell/plain-page';
import { ButtonLink } from '@/components/ui/button-link';

export const metadata: Metadata = { title: 'Nothing here' };

export default function NotFound() {
  return (
    <PlainPage code="404" title="There is nothing here" actions={<><ButtonLink href="/benches" tone="primary" size="large">To your bench</ButtonLink><ButtonLink href="/sign-in" size="large">Sign in</ButtonLink></>}>
      The address is wrong, or it belongs to a bench you are not in. Ask whoever sent it.
    </PlainPage>
  );
}
