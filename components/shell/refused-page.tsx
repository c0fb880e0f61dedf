import { ButtonLink } from '@/components/ui/button-link';
import { PlainPage } from './plain-page';

/** The reader sees the thing, but their role does not allow this page. */
export function RefusedPage({ what, href }: { readonly what: string; readonly href: string }) {
  return (
    <PlainPage code="403" title="Not with your role" actions={<ButtonLink href={href} tone="primary" size="large">Go back</ButtonLink>}>
      {what} is not open to you. A maker of the circuit or a steward of the bench can help.
    </PlainPage>
  );
}
