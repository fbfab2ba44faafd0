/** All cut parts of some capacitors on a workshop's sheets, kind of sheet by kind of sheet. */

import type { KerfState } from '../cutting/cut-path';
import type { CuttingFinding } from '../cutting/cutting-finding';
import type { Machine, Sheet } from '../cutting/machine';
import { partFindings } from '../cutting/part-findings';
import { reachable, sizeFinding } from '../cutting/room';
import type { CutPart } from '../parts/part';
import { formatQuantity } from '../quantity';
import type { Layout, LayoutSettings } from './layout';
import { nest } from './nest';
import { tallyOf, type Tally } from './tally';

export interface LayoutJob {
  readonly parts: readonly CutPart[];
  /** How many capacitors. */
  readonly copies: number;
  readonly machine: Machine;
  readonly sheets: readonly Sheet[];
  readonly settings: LayoutSettings;
  readonly kerf: KerfState;
}

/** Parts of one material and thickness. */
export interface LaidGroup {
  readonly material: Sheet['material'];
  readonly thickness: number;
  readonly parts: readonly CutPart[];
  readonly layout: Layout;
  readonly tally: Tally;
}

export interface LaidOut {
  readonly groups: readonly LaidGroup[];
  readonly findings: readonly CuttingFinding[];
}

/** mm. Sheets this near in thickness are the same. */
const SAME_THICKNESS = 1e-6;

const mm = (value: number): string => formatQuantity(value, 'length', 4);

function groupsOf(parts: readonly CutPart[]): CutPart[][] {
  const groups = new Map<string, CutPart[]>();
  for (const part of parts) {
    const key = `${part.material} ${part.thickness}`;
    groups.set(key, [...(groups.get(key) ?? []), part]);
  }
  return [...groups.values()];
}

const whole = {
  part: null,
  value: null,
  limit: null,
  quantity: 'count',
} as const;

function gapFindings({ machine, settings }: LayoutJob): CuttingFinding[] {
  const { gap, margin } = settings;
  const narrow = Math.min(gap, margin);
  const { kerf, leadIn } = machine;
  const lead = leadIn + kerf;
  return [
    {
      code: 'gap-small',
      severity: gap >= kerf ? 'ok' : 'fail',
      part: null,
      label: 'Gap between parts against the kerf',
      value: gap,
      limit: kerf,
      quantity: 'length',
      change: gap >= kerf ? '' : `Two cuts would meet: make the gap at least ${mm(kerf)}.`,
    },
    {
      code: 'lead-in-long',
      severity: narrow >= lead ? 'ok' : 'warn',
      part: null,
      label: 'Gap and margin against lead-in and kerf',
      value: narrow,
      limit: lead,
      quantity: 'length',
      change:
        narrow >= lead
          ? ''
          : `A lead-in may mark the next part or begin off the sheet: make gap and margin at least ${mm(lead)}, or shorten the lead-in.`,
    },
  ];
}

/**
 * @param progress told how much is done; answering false stops it
 * @returns null when stopped
 */
export function layOut(
  job: LayoutJob,
  progress: (done: number, of: number) => boolean = () => true,
): LaidOut | null {
  const { machine, settings, copies } = job;
  const findings: CuttingFinding[] = [
    ...job.parts.flatMap((part) => partFindings(part, machine)),
    ...gapFindings(job),
  ];
  const groups: LaidGroup[] = [];
  const all = groupsOf(job.parts);
  for (const [index, parts] of all.entries()) {
    const { material, thickness } = parts[0]!;
    const stocks = job.sheets
      .filter(
        (sheet) =>
          sheet.material === material &&
          Math.abs(sheet.thickness - thickness) < SAME_THICKNESS &&
          sheet.count > 0,
      )
      .map((sheet) => ({ ...reachable(sheet, machine), count: sheet.count }));
    const largest = stocks.reduce<(typeof stocks)[number] | null>(
      (a, b) => (a && a.width * a.height >= b.width * b.height ? a : b),
      null,
    );
    if (!largest) {
      findings.push({
        ...whole,
        code: 'no-sheet',
        severity: 'fail',
        label: `${mm(thickness)} ${material} in store`,
        change: `None is listed: add ${mm(thickness)} ${material} to the sheets, or change the parts' thickness to one that is.`,
      });
      continue;
    }
    const room = {
      width: largest.width - 2 * settings.margin,
      height: largest.height - 2 * settings.margin,
    };
    findings.push(...parts.map((part) => sizeFinding(part, room, settings.margin)));
    const pieces = parts.map(({ key, outside, quantity }) => ({
      key,
      outside,
      quantity: quantity * copies,
    }));
    const layout = nest(pieces, stocks, settings, (done, of) =>
      progress(index * 1000 + Math.round((1000 * done) / of), all.length * 1000),
    );
    if (!layout) return null;
    groups.push({
      material,
      thickness,
      parts,
      layout,
      tally: tallyOf(layout, parts, machine, job.kerf),
    });
    const left = layout.left.reduce((sum, { quantity }) => sum + quantity, 0);
    if (left > 0) {
      findings.push({
        code: 'sheets-short',
        severity: 'fail',
        part: null,
        label: `Parts without room, ${mm(thickness)} ${material}`,
        value: left,
        limit: 0,
        quantity: 'count',
        change: 'Add sheets, take larger ones, or make gap and margin smaller.',
      });
    }
  }
  return { groups, findings };
}
