export function endWithUs(end: () => void | Promise<void>): () => Promise<void>;
export function runUntilStopped(main: () => Promise<void>): Promise<void>;
