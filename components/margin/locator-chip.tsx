import { Icon } from '@/components/ui/icon';

/** Below the width of the leaders: the zone of the target, which jumps there. */
export function LocatorChip({ zone, words, onJump }: { readonly zone: string; readonly words: string; readonly onJump: () => void }) {
  return (
    <button type="button" onClick={onJump} aria-label={`Show ${words} on the sheet, zone ${zone}`} className="flex h-[18px] flex-none items-center gap-1 rounded-box border border-edge bg-film px-[5px] font-mono text-legend leading-none text-act wide:hidden max-tablet:h-target max-tablet:min-w-target max-tablet:border-0 max-tablet:bg-transparent max-tablet:text-sm">
      <Icon name="target" className="size-[11px] max-tablet:size-4" />
      {zone}
    </button>
  );
}
