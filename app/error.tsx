'use client';
import { PlainPage } from '@/components/shell/plain-page';
import { Button } from '@/components/ui/button';
import { ButtonLink } from '@/components/ui/button-link';

export default function ErrorPage({ error, reset }: { readonly error: Error & { readonly digest?: string }; readonly reset: () => void }) {
  return (
    <PlainPage code="500" title="Something went wrong on our side" actions={<><Button tone="primary" size="large" icon="retry" onClick={reset}>Try again</Button><ButtonLink href="/benches" size="large">To your bench</ButtonLink></>}>
      Nothing that was saved is lost. If it stays so, quote this reference: <span className="figure text-ink">{error.digest ?? 'none'}</span>.
    </PlainPage>
  );
}
