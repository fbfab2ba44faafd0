'use client';

import { useState } from 'react';
import { formatQuantity, type Derived } from '@/geometry';
import { lossLeftOut, surfaceMetal } from '@/geometry/electrical/loss';
import { NumberField } from '../number-field';
import { hasFrequency, lawPoint } from './law-point';
import { QPlot } from './q-plot';

const ohms = (value: number): string =>
  value < 1
    ? `${Number((1000 * value).toPrecision(3))} mΩ`
    : `${Number(value.toPrecision(3))} Ω`;

const microns = (value: number): string => `${Number((1000 * value).toPrecision(3))} µm`;

/** mΩ, to begin with: a guess, no source. */
const CONTACTS = 10;

const rough = new Intl.NumberFormat('en', { maximumSignificantDigits: 2 });

/** Fractions of the law at which the table has a row. */
const ROWS = [0, 0.25, 0.5, 0.75, 1];

/** Loss and Q over the band, or at the working frequency. */
export function LossTable({ derived, section }: { derived: Derived; section: number }) {
  const [contacts, setContacts] = useState(CONTACTS);
  const { design } = derived;
  if (!hasFrequency(derived, section)) {
    return (
      <p>
        Give a working frequency above, or the band with its coil, and loss and Q are reckoned
        here.
      </p>
    );
  }
  const rows = ROWS.map((fraction) => lawPoint(derived, section, fraction, contacts / 1000));
  return (
    <>
      <NumberField
        label="Contacts and leads, mΩ"
        value={contacts}
        min={0}
        max={100000}
        onChange={setContacts}
      />
      <p className="text-small text-ink-2">
        10 mΩ is a guess for a sound wiper with its joints, no source: measure yours.
      </p>
      <div role="region" aria-label="Loss and Q" tabIndex={0} className="overflow-x-auto">
        <table className="dense w-full text-right text-small tabular-nums">
          <thead>
            <tr className="border-b border-edge">
              {[
                'At',
                'Section has',
                'Skin depth',
                'Plates',
                'Spacers',
                'Q at most',
                'with contacts',
              ].map((title) => (
                <th key={title} scope="col" className="py-1.5 pl-3 font-medium first:pl-0">
                  {title}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ capacitance, frequency, loss }) => (
              <tr key={capacitance} className="border-b border-line">
                <th scope="row" className="py-1.5 font-normal whitespace-nowrap">
                  {formatQuantity(frequency, 'frequency', 4)}
                </th>
                <td className="whitespace-nowrap">
                  {formatQuantity(capacitance, 'capacitance', 4)}
                </td>
                <td className="whitespace-nowrap">{microns(loss.skinDepth)}</td>
                <td className="whitespace-nowrap">{ohms(loss.plates)}</td>
                <td className="whitespace-nowrap">{ohms(loss.rods)}</td>
                <td>{rough.format(loss.q)}</td>
                <td>{rough.format(loss.qWithContacts)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="text-small text-ink-2">
        Q with contacts over the shaft angle, where the law holds.
      </p>
      <QPlot derived={derived} section={section} contacts={contacts / 1000} />
      <p className="text-small text-ink-2">
        With wholly meshed plates of {surfaceMetal(design)}
        {design.finish === 'silver' &&
          `, if the silver is some times ${microns(rows[0]!.loss.skinDepth)} thick`}
        {surfaceMetal(design) === 'steel' &&
          '; how magnetic steel is differs from batch to batch, so take its loss as an order of magnitude'}
        . Spacers are reckoned bare. Plates and spacers alone set the bound; contacts and
        insulators commonly lose many times more, so measure the true Q. Left out:{' '}
        {lossLeftOut.join('; ')}.
      </p>
    </>
  );
}
