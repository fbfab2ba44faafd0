import { create, UnitDependencies, type FactoryFunctionMap } from 'mathjs';
import type { Quantity } from '@/geometry';
import { readNumberText } from './number-text';

// Units alone: the rest of mathjs is many times larger and nothing here needs it.
const { Unit } = create(UnitDependencies as FactoryFunctionMap);

/** The kernel's unit of each quantity, in mathjs's spelling. */
const kernelUnits: Record<Quantity, string | null> = {
  length: 'mm',
  altitude: 'mm',
  angle: 'rad',
  capacitance: 'F',
  inductance: 'H',
  frequency: 'Hz',
  voltage: 'V',
  count: null,
  ratio: null,
};

/** Spellings of the bench that mathjs doesn't have or reads as something else. */
const spellings: Record<string, string> = {
  '"': 'in',
  '″': 'in',
  inches: 'in',
  thou: 'mil',
  '°': 'deg',
  degree: 'deg',
  degrees: 'deg',
  pf: 'pF',
  nf: 'nF',
  uf: 'uF',
  nh: 'nH',
  uh: 'uH',
  mh: 'mH',
  hz: 'Hz',
  khz: 'kHz',
  mhz: 'MHz',
  ghz: 'GHz',
  v: 'V',
  kv: 'kV',
};

function mathjsUnit(written: string): string {
  const ascii = written.trim().replace(/[µμ]/g, 'u');
  return spellings[ascii] ?? spellings[ascii.toLowerCase()] ?? ascii;
}

/**
 * Reads a quantity as people write it, in kernel units; a bare number is in `shownUnit`.
 * Null when it is no number, or its unit is unknown or of another quantity.
 */
export function readQuantity(
  text: string,
  quantity: Quantity,
  shownUnit: string,
): number | null {
  const written = readNumberText(text);
  if (!written || !Number.isFinite(written.value)) return null;
  const kernelUnit = kernelUnits[quantity];
  if (kernelUnit === null) return written.unit === '' ? written.value : null;
  const unit = mathjsUnit(written.unit || shownUnit);
  if (!Unit.isValuelessUnit(unit)) return null;
  const amount = new Unit(written.value, unit);
  if (!amount.equalBase(new Unit(1, kernelUnit))) return null;
  return amount.toNumber(kernelUnit);
}
