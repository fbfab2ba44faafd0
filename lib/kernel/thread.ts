/** What a thread of the kernel does when it is asked (kernel.ts). */

import { constants, setPriority } from 'node:os';
import { isMainThread } from 'node:worker_threads';
import type { Derivation, Derived, Design } from '@/geometry';
import type { Machine } from '@/geometry/cutting/machine';
import type { CutPart } from '@/geometry/parts/part';
import { deriveDesign } from './derive-design';
import type { FileNames } from './file-names';
import type { HashedFile } from './hashed-file';
import { machineCautions } from './machine-cautions';
import { makeFiles } from './make-files';

export interface Tasks {
  derive: (design: Design) => Derivation;
  makeFiles: (derived: Derived, names: FileNames) => Promise<HashedFile[]>;
  machineCautions: (parts: readonly CutPart[], machine: Machine) => string[];
}

// Linux has it for each thread: who only reads goes before who derives, on few cores too.
if (!isMainThread) setPriority(constants.priority.PRIORITY_BELOW_NORMAL);

const tasks: Tasks = { derive: deriveDesign, makeFiles, machineCautions };

/** One thing to do, with what it takes. */
export type Task = {
  [Name in keyof Tasks]: { readonly name: Name; readonly args: Parameters<Tasks[Name]> };
}[keyof Tasks];

export default function perform(task: Task): unknown {
  const perform = tasks[task.name] as (...args: readonly unknown[]) => unknown;
  return perform(...task.args);
}
