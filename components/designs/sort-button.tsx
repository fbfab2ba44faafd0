import type { ReactNode } from 'react';

/** A column head that sorts; the arrow says which way, the cell's aria-sort says it aloud. */
export function SortButton({
  direction,
  onPress,
  children,
}: {
  direction: false | 'asc' | 'desc';
  onPress: () => void;
  children: ReactNode;
}) {
  return (
    <button
      type="button"
      onClick={onPress}
      className="flex min-h-11 items-center gap-1.5 text-small font-semibold whitespace-nowrap text-ink-2 hover:text-ink"
    >
      {children}
      <svg width="8" height="10" viewBox="0 0 8 10" aria-hidden="true">
        {direction !== 'desc' && (
          <path d="M4 0 7.5 4H.5z" fill="currentColor" opacity={direction ? 1 : 0.35} />
        )}
        {direction !== 'asc' && (
          <path d="M4 10 .5 6h7z" fill="currentColor" opacity={direction ? 1 : 0.35} />
        )}
      </svg>
    </button>
  );
}
