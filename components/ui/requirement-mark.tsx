export type RequirementResult = 'satisfied' | 'not satisfied' | 'not applicable' | 'overridden' | 'error';

const art: Readonly<Record<RequirementResult, React.ReactNode>> = {
  satisfied: (
    <>
      <rect x="1" y="1" width="18" height="18" rx="2" className="fill-signed" />
      <path d="M5 10.5L8.5 14L15 6.5" className="fill-none stroke-on-signed" strokeWidth="2" />
    </>
  ),
  'not satisfied': (
    <g transform="translate(10 10)" className="fill-film stroke-stop" strokeWidth="1.8">
      <path d="M-4.2 -10H4.2L10 -4.2V4.2L4.2 10H-4.2L-10 4.2V-4.2Z" />
      <path d="M-3.6 -3.6L3.6 3.6M3.6 -3.6L-3.6 3.6" />
    </g>
  ),
  'not applicable': <path d="M5 10H15" className="stroke-ink-3" strokeWidth="1.6" />,
  overridden: (
    <g className="stroke-caution-ink">
      <rect x="1.5" y="1.5" width="17" height="17" className="fill-film" strokeWidth="1.6" strokeDasharray="3 2" />
      <path d="M5.5 14.5L14.5 5.5" strokeWidth="2" />
    </g>
  ),
  error: (
    <>
      <rect x="1.5" y="1.5" width="17" height="17" className="fill-film stroke-ink" strokeWidth="1.6" />
      <text x="10" y="15" textAnchor="middle" className="fill-ink font-cond text-body font-bold">!</text>
    </>
  ),
};

/** One of the five results of a requirement, told apart by shape and spoken by name. */
export function RequirementMark({ result, size = 20 }: { readonly result: RequirementResult; readonly size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 20 20" role="img" aria-label={result} className="flex-none overflow-visible">
      {art[result]}
    </svg>
  );
}
