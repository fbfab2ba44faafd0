'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useMemo, useState } from 'react';
import { differences } from '@/components/design/differences';
import { SectionPicker } from '@/components/design/section-picker';
import { AngleRule } from '@/components/floor/angle-rule';
import { createAngleStore } from '@/components/floor/angle-store';
import { OverlayFloor } from '@/components/floor/overlay-floor';
import type { Derivation, Derived, Design } from '@/geometry';
import type { History } from '@/lib/schemas/revision';
import { figurePairs } from './figures-of';
import { lawDifference } from './law-difference';
import { LawDifferenceChart } from './law-difference-chart';
import { PairTable } from './pair-table';
import { compareHref, StatePair, type Pair } from './state-pair';

/** One of the two states that lie beside each other. */
interface Compared {
  /** As `Revision 2`. */
  readonly title: string;
  readonly design: Design;
  readonly derivation: Derivation;
}

type Two<T> = readonly [T, T];

function Parameters({ states: [a, b] }: { states: Two<Compared> }) {
  const rows = differences(a.design, b.design).map(({ label, mine, theirs }) => [
    label,
    mine,
    mine === theirs ? `${theirs}, other values` : theirs,
  ]);
  return (
    <section className="flex min-w-0 flex-col gap-2">
      <h2 className="text-title">Parameters that differ</h2>
      <PairTable
        caption="Parameters that differ"
        titles={['Parameter', a.title, b.title]}
        rows={rows}
        none="None: both have the same parameters."
      />
    </section>
  );
}

function FiguresReached({ titles, derived }: { titles: Two<string>; derived: Two<Derived> }) {
  const [all, setAll] = useState(false);
  const pairs = figurePairs(...derived);
  const shown = all ? pairs : pairs.filter(({ same }) => !same);
  return (
    <section className="flex min-w-0 flex-col gap-2">
      <h2 className="text-title">What they reach</h2>
      <label className="flex min-h-11 items-center gap-2">
        <input
          type="checkbox"
          checked={all}
          onChange={(event) => setAll(event.target.checked)}
          className="size-5 accent-action"
        />
        Also what is the same
      </label>
      <PairTable
        caption="What they reach"
        titles={['Figure', ...titles, 'Change']}
        rows={shown.map(({ label, a, b, change, same }) => [
          label,
          a ?? '–',
          b ?? '–',
          same ? 'none' : (change ?? '–'),
        ])}
        none="Every figure is the same."
      />
    </section>
  );
}

/** Outlines and laws of one section of both, turned together. */
function Plates({ titles, derived }: { titles: Two<string>; derived: Two<Derived> }) {
  const [a, b] = derived;
  const [section, setSection] = useState(0);
  // What both turn through.
  const travel = Math.min(a.turn.travel, b.turn.travel);
  const [store] = useState(() => {
    const created = createAngleStore(travel);
    created.set(0.6 * travel);
    return created;
  });
  const count = Math.min(a.sections.length, b.sections.length);
  const [first, second] = [a.sections[section]!, b.sections[section]!];
  const series = useMemo(() => lawDifference(first, second), [first, second]);
  return (
    <section className="flex min-w-0 flex-col gap-2">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h2 className="text-title">Outlines and laws</h2>
        {count > 1 && <SectionPicker count={count} section={section} onChange={setSection} />}
      </div>
      {a.turn.travel !== b.turn.travel && (
        <p>They turn through different angles; this is as far as both do.</p>
      )}
      <div className="border border-line">
        <div className="h-[min(92vw,34rem)] *:h-full">
          <OverlayFloor
            states={[
              { title: titles[0], derived: a },
              { title: titles[1], derived: b },
            ]}
            section={section}
            store={store}
          />
        </div>
        <AngleRule store={store} travel={travel} />
        <LawDifferenceChart series={series} titles={titles} />
      </div>
    </section>
  );
}

/** Two states of a design beside each other: parameters, outlines, laws and figures. */
export function CompareScreen({
  designId,
  name,
  history,
  pair,
  states,
}: {
  designId: string;
  name: string;
  history: History;
  pair: Pair;
  states: Two<Compared>;
}) {
  const router = useRouter();
  const [a, b] = states;
  const titles = [a.title, b.title] as const;
  const derived =
    a.derivation.ok && b.derivation.ok
      ? ([a.derivation.derived, b.derivation.derived] as const)
      : null;
  return (
    <main id="main" className="mx-auto flex w-full max-w-300 flex-col gap-6 px-5 py-5">
      <div>
        <h1 className="text-head wrap-anywhere">Compare two states of {name}</h1>
        <p>
          <Link
            href={`/designs/${designId}/revisions`}
            className="inline-flex min-h-11 items-center"
          >
            All revisions
          </Link>
        </p>
      </div>
      <div className="flex flex-wrap items-end gap-3">
        <StatePair
          history={history}
          pair={pair}
          onChange={(next) => router.replace(compareHref(designId, next), { scroll: false })}
        />
      </div>
      <Parameters states={states} />
      {derived ? (
        <>
          <Plates titles={titles} derived={derived} />
          <FiguresReached titles={titles} derived={derived} />
        </>
      ) : (
        <p className="border-l-4 border-warn bg-warn-tint px-3 py-2">
          {[a, b]
            .filter(({ derivation }) => !derivation.ok)
            .map(({ title }) => title)
            .join(' and ')}{' '}
          gives no plates, so outlines and figures cannot be compared.
        </p>
      )}
    </main>
  );
}
