const looks = {
  action: 'border-action bg-action text-white hover:bg-action-dark hover:border-action-dark',
  plain: 'border-edge bg-panel text-ink hover:bg-white hover:border-ink-2',
  danger: 'border-bad bg-panel text-bad hover:bg-bad hover:text-white',
  quiet: 'border-transparent bg-transparent text-ink hover:bg-well',
} as const;

export type ButtonLook = keyof typeof looks;

/** The classes of a button, also for a link that must look like one. */
export function buttonClass(look: ButtonLook): string {
  return `inline-flex min-h-9 items-center justify-center gap-2 rounded-[3px] border px-3.5 py-1.5 text-body font-semibold whitespace-nowrap no-underline transition-colors max-bench:min-h-11 disabled:opacity-55 ${looks[look]}`;
}
