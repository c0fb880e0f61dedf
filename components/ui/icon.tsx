import { classNames } from './class-names';

/** Our own line icons on a 16-unit square. */
const paths = {
  back: 'M10 3.5L5.5 8L10 12.5',
  bars: 'M2.5 4H13.5M2.5 8H13.5M2.5 12H13.5',
  check: 'M2.5 8.5L6.5 12.5L13.5 4',
  close: 'M3.5 3.5L12.5 12.5M12.5 3.5L3.5 12.5',
  cut: 'M2 3H11V13H2ZM14 1V15',
  down: 'M3.5 6L8 10.5L12.5 6',
  find: 'M7 2.5a4.5 4.5 0 1 0 0 9a4.5 4.5 0 1 0 0 -9M10.3 10.3L14 14',
  fit: 'M2.5 6V2.5H6M10 2.5H13.5V6M13.5 10V13.5H10M6 13.5H2.5V10',
  flag: 'M3.5 14.5V2H12L9.5 5L12 8H3.5',
  funnel: 'M2 3H14L9.5 8.5V13.5L6.5 12V8.5Z',
  lock: 'M4 7.5H12V13.5H4ZM5.5 7.5V5a2.5 2.5 0 0 1 5 0V7.5',
  minus: 'M3 8H13',
  moon: 'M12.8 10.2A5.8 5.8 0 1 1 6.6 2.4A4.6 4.6 0 0 0 12.8 10.2Z',
  out: 'M9 2.5H13.5V13.5H9M2 8H10M7 5L10 8L7 11',
  pencil: 'M3 13L3.6 10.2L10.8 3L13 5.2L5.8 12.4Z',
  person: 'M8 2.5a2.7 2.7 0 1 0 0 5.4a2.7 2.7 0 1 0 0 -5.4M2.8 14a5.2 4.6 0 0 1 10.4 0',
  plus: 'M8 3V13M3 8H13',
  redo: 'M13 6.5H6a3.5 3.5 0 0 0 0 7H10M10 3.2L13.2 6.5L10 9.8',
  retry: 'M13 8a5 5 0 1 1 -1.6 -3.7M13 2V5H10',
  sun: 'M8 5a3 3 0 1 0 .01 0M8 1V2.6M8 13.4V15M1 8H2.6M13.4 8H15M3 3L4.1 4.1M11.9 11.9L13 13M13 3L11.9 4.1M4.1 11.9L3 13',
  target: 'M8 4.5a3.5 3.5 0 1 0 0 7a3.5 3.5 0 1 0 0 -7M8 1V5M8 11V15M1 8H5M11 8H15',
  undo: 'M3 6.5H10a3.5 3.5 0 0 1 0 7H6M6 3.2L2.8 6.5L6 9.8',
  up: 'M3.5 10L8 5.5L12.5 10',
  upload: 'M8 11V3M4.8 6L8 2.8L11.2 6M2.5 13.5H13.5',
} as const;

export type IconName = keyof typeof paths;

/** Decoration only: the control that holds it carries the name. */
export function Icon({ name, className }: { readonly name: IconName; readonly className?: string }) {
  return (
    <svg viewBox="0 0 16 16" aria-hidden="true" className={classNames('size-4 flex-none fill-none stroke-current', className)} strokeWidth="1.5" strokeLinecap="square">
      <path d={paths[name]} />
    </svg>
  );
}
