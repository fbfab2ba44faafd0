'use client';

import { useEffect, useRef, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import type { ToolName } from './places';
import { tools } from './registry';
import type { ToolProps } from './tool-props';

/** A tool beside the design, which stays in sight and can be worked on meanwhile. */
export default function ToolSheet({
  tool,
  notice,
  ...props
}: ToolProps & {
  tool: ToolName;
  /** What the tool did last, with a way back. */
  notice: ReactNode;
}) {
  const heading = useRef<HTMLHeadingElement>(null);
  const { title, Component } = tools[tool];
  const { close } = props;

  useEffect(() => {
    const before = document.activeElement;
    heading.current?.focus();
    return () => {
      if (before instanceof HTMLElement && before.isConnected) before.focus();
    };
  }, [tool]);

  // What had the focus may be gone, or disabled by what it did: then it is nowhere.
  useEffect(() => {
    const onKey = ({ key, defaultPrevented }: KeyboardEvent): void => {
      if (key !== 'Escape' || defaultPrevented) return;
      if (document.activeElement === document.body) close();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [close]);

  return (
    <div
      role="dialog"
      aria-label={title}
      // Whoever clicks on its text stays in it, so that Escape closes it.
      tabIndex={-1}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || event.defaultPrevented) return;
        event.stopPropagation();
        close();
      }}
      className="fixed inset-y-0 right-0 z-40 flex w-full flex-col border-l border-edge bg-panel shadow-[-8px_0_24px_rgb(20_32_31/0.18)] outline-none bench:top-12 bench:w-[36rem]"
    >
      <header className="flex items-center gap-3 border-b border-line px-5 py-2.5">
        <h2
          ref={heading}
          tabIndex={-1}
          className="wide-letter text-title font-semibold outline-none"
        >
          {title}
        </h2>
        <Button className="ml-auto" onPress={close}>
          Close
        </Button>
      </header>
      <div className="relative flex min-h-0 grow flex-col gap-4 overflow-y-auto px-5 py-4">
        {notice}
        <Component {...props} />
      </div>
    </div>
  );
}
