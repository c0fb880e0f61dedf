/** What the marks of the small ladders mean. */
export function LadderKey() {
  const entry = 'inline-flex items-center gap-2';
  return (
    <ul className="flex flex-wrap gap-x-6 gap-y-1.5 text-sm text-ink-2 max-wide:hidden">
      <li className={entry}><svg width="27" height="14" aria-hidden="true"><path d="M0 4H24V1H27V14H24V11H0Z" className="fill-signed" /></svg>signed off to here</li>
      <li className={entry}><svg width="27" height="12" aria-hidden="true"><rect x="1" y="2" width="25" height="8" className="fill-none stroke-signed-ink" strokeWidth="1.4" strokeDasharray="4 3" /></svg>an earlier revision only</li>
      <li className={entry}><svg width="18" height="18" viewBox="-11 -11 22 22" aria-hidden="true"><path d="M-4.6 -11H4.6L11 -4.6V4.6L4.6 11H-4.6L-11 4.6V-4.6Z" className="fill-stop" /></svg>a stop blocks here</li>
      <li className={entry}><svg width="30" height="6" aria-hidden="true"><path d="M0 3H30" className="stroke-ink" strokeWidth="4.6" /><path d="M0 3H30" stroke="var(--film)" strokeWidth="2" /></svg>above 60 V</li>
    </ul>
  );
}
