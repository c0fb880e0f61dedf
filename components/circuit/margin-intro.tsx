/** What the margin says before anything stands in it. */
export function MarginIntro({ empty, checking }: { readonly empty: boolean; readonly checking: boolean }) {
  if (empty) {
    return <div><p className="text-body font-semibold">Findings and notes stand here</p><p className="text-md text-ink-2">Each is tied by a line to its part, at the height where the part is. You can leave a note on an empty sheet too: what should it heat, and how hot?</p></div>;
  }
  return <p className="text-md text-ink-2">{checking ? 'Checking the sheet.' : 'No finding and no note. Every check that ran passed or does not apply.'}</p>;
}
