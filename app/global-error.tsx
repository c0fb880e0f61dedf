'use client';
import './globals.css';

/** The last page, when even the layout failed: no data, no script of ours needed. */
export default function GlobalError({ error }: { readonly error: Error & { readonly digest?: string } }) {
  return (
    <html lang="en">
      <body>
        <main className="grid min-h-screen place-items-center bg-film p-6 text-ink">
          <div className="max-w-[480px] border-[1.5px] border-ink p-6">
            <h1 className="font-cond text-2xl font-semibold">Holdoff does not answer</h1>
            <p className="mt-2 text-body text-ink-2">Nothing that was saved is lost. Reload in a minute; if it stays so, quote {error.digest ?? 'the time'}.</p>
          </div>
        </main>
      </body>
    </html>
  );
}
