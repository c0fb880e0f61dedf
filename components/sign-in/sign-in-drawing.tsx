/** A lamp, its fuse and a switch left open: decoration, in the strokes of the symbol plate. */
export function SignInDrawing() {
  const ref = 'fill-ink font-mono text-xl font-bold tracking-[-.02em]';
  const value = 'fill-ink-2 font-mono text-lg tracking-[-.03em]';
  return (
    <svg aria-hidden="true" viewBox="120 150 720 560" className="absolute top-[12%] left-[6%] h-[72%] max-w-[54%] fill-none stroke-ink max-wide:opacity-50 max-tablet:hidden" strokeWidth="2.4">
      <path d="M186 416V234H301M359 234H515M577 234H730V424M730 476V682H186V464" />
      <g transform="translate(186 440)" strokeWidth="3.4">
        <path d="M-21 -17H21M-21 5H21" />
        <path d="M-9 -6.5H9M-9 17H9" strokeWidth="7" />
        <path d="M0 -17V-24M0 17V24M14 -30H22M18 -34V-26" strokeWidth="2.4" />
      </g>
      <g transform="translate(330 234)"><path d="M-29 -10.5H29V10.5H-29Z" className="fill-film" /><path d="M-29 0H29" /></g>
      <path d="M515 234L557 216" />
      <g transform="translate(730 450)"><circle r="21" className="fill-film" /><path d="M-15 -15L15 15M15 -15L-15 15M0 -26V-21M0 21V26" /></g>
      <g stroke="none">
        <text x="330" y="192" textAnchor="middle" className={ref}>F1</text>
        <text x="330" y="214" textAnchor="middle" className={value}>500 mA</text>
        <text x="536" y="192" textAnchor="middle" className={ref}>S1</text>
        <text x="222" y="438" className={ref}>BT1</text>
        <text x="222" y="460" className={value}>12 V</text>
        <text x="766" y="438" className={ref}>DS1</text>
        <text x="766" y="460" className={value}>12 V 2 W</text>
      </g>
    </svg>
  );
}
