import { AccountMenu } from './account-menu';
import { PhoneBar } from './phone-bar';
import { ThemeToggle } from './theme-toggle';
import { BarRule, Crumb, TopBar } from './top-bar';

interface BenchBarProps {
  readonly bench: { readonly slug: string; readonly name: string };
  readonly person: { readonly name: string; readonly email: string };
  /** Title on a phone, when it is not the bench's name. */
  readonly title?: string;
  readonly back?: { readonly href: string; readonly words: string };
}

/** The top edge of a bench's pages, at both widths. */
export function BenchBar({ bench, person, title, back }: BenchBarProps) {
  return (
    <>
      <div className="max-tablet:hidden">
        <TopBar brandHref={`/benches/${bench.slug}`} crumbs={<><BarRule /><Crumb legend="Bench" name={bench.name} href={`/benches/${bench.slug}`} /></>}>
          <ThemeToggle />
          <AccountMenu person={person} />
        </TopBar>
      </div>
      <div className="tablet:hidden">
        <PhoneBar heading back={back} title={title ?? bench.name} under={title ? bench.name : undefined}><ThemeToggle /><AccountMenu person={person} phone /></PhoneBar>
      </div>
    </>
  );
}
