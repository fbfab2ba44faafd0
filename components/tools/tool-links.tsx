'use client';

import { createContext, use } from 'react';
import { openers, toolsAt, type ToolName, type ToolPlace } from './places';

/** Opens a tool beside the design; null where nothing can be changed. */
export const OpenToolContext = createContext<((tool: ToolName) => void) | null>(null);

/** The tools whose answer is used at a place, each by a quiet button. */
export function ToolLinks({ place }: { place: ToolPlace }) {
  const open = use(OpenToolContext);
  if (!open) return null;
  return (
    <p className="flex flex-wrap gap-x-4">
      {toolsAt[place].map((name) => (
        <button
          key={name}
          type="button"
          onClick={() => open(name)}
          className="min-h-8 text-left text-small font-medium text-action underline underline-offset-2 max-bench:min-h-11"
        >
          {openers[name]}
        </button>
      ))}
    </p>
  );
}
