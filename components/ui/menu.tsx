'use client';
import { useEffect, useId, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { classNames } from './class-names';

export interface MenuItem {
  readonly key: string;
  readonly words: ReactNode;
  readonly onSelect: () => void;
  readonly danger?: boolean;
}

interface MenuProps {
  /** Spoken name of the opener. */
  readonly label: string;
  readonly opener: ReactNode;
  readonly openerClassName?: string;
  readonly heading?: ReactNode;
  readonly items: readonly MenuItem[];
}

/** A menu button: arrows move, Home and End jump, Escape and Tab close and give the focus back. */
export function Menu({ label, opener, openerClassName, heading, items }: MenuProps) {
  const [open, setOpen] = useState(false);
  const root = useRef<HTMLDivElement>(null);
  const list = useRef<HTMLDivElement>(null);
  const id = useId();

  useEffect(() => {
    if (!open) return;
    list.current?.querySelector<HTMLElement>('[role=menuitem]')?.focus();
    const away = (event: PointerEvent) => {
      if (!root.current?.contains(event.target as Node)) setOpen(false);
    };
    document.addEventListener('pointerdown', away);
    return () => document.removeEventListener('pointerdown', away);
  }, [open]);

  const close = () => {
    setOpen(false);
    root.current?.querySelector<HTMLElement>('button')?.focus();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const all = [...(list.current?.querySelectorAll<HTMLElement>('[role=menuitem]') ?? [])];
    const at = all.indexOf(document.activeElement as HTMLElement);
    const to = { ArrowDown: (at + 1) % all.length, ArrowUp: (at - 1 + all.length) % all.length, Home: 0, End: all.length - 1 }[event.key];
    if (to !== undefined) {
      event.preventDefault();
      all[to]?.focus();
    } else if (event.key === 'Escape') {
      event.preventDefault();
      close();
    } else if (event.key === 'Tab') setOpen(false);
  };

  return (
    <div ref={root} className="relative">
      <button type="button" aria-label={label} aria-haspopup="menu" aria-expanded={open} aria-controls={open ? id : undefined} onClick={() => setOpen(!open)} className={openerClassName}>
        {opener}
      </button>
      {open ? (
        <div className="absolute top-full right-0 z-30 mt-1 w-max min-w-[210px] rounded-key border border-edge bg-film py-1 text-md text-ink shadow-lift">
          {heading ? <div className="border-b border-rule px-3 pt-1 pb-2">{heading}</div> : null}
          <div ref={list} id={id} role="menu" aria-label={label} onKeyDown={onKeyDown}>
            {items.map((item) => (
              <button
                key={item.key}
                type="button"
                role="menuitem"
                tabIndex={-1}
                onClick={() => { close(); item.onSelect(); }}
                className={classNames('flex h-8 w-full items-center gap-2.5 px-3 text-left hover:bg-act-wash focus:bg-act-wash focus:shadow-[inset_3px_0_0_var(--act)] focus:outline-none max-tablet:h-target', item.danger && 'text-stop-ink')}
              >
                {item.words}
              </button>
            ))}
          </div>
        </div>
      ) : null}
    </div>
  );
}
