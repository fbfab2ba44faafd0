import { createEdgeCache, derive, type Design } from '@/geometry';
import { candidateOf, variantsOf, type Candidate } from '@/geometry/advice/advise';
import { failureOf, type JobMessage } from '@/components/tools/job/messages';

export type FitQuestion =
  | { readonly kind: 'list'; readonly design: Design; readonly section: number }
  /** Derives one design in full before it is taken. */
  | { readonly kind: 'try'; readonly design: Design };

export type FitAnswer =
  | { readonly kind: 'list'; readonly candidates: Candidate[]; readonly looked: number }
  | { readonly kind: 'try'; readonly design: Design; readonly refusals: string[] };

/** Candidates between two notes of progress. */
const STEP = 10;

const cache = createEdgeCache();

const send = (message: JobMessage<FitAnswer>): void => postMessage(message);

function list(design: Design, section: number): FitAnswer {
  const variants = variantsOf(design, section);
  const candidates: Candidate[] = [];
  variants.forEach((variant, i) => {
    const candidate = candidateOf(design, section, variant, cache);
    if (candidate) candidates.push(candidate);
    if (i % STEP === 0) send({ done: i, of: variants.length });
  });
  return { kind: 'list', candidates, looked: variants.length };
}

function tryOut(design: Design): FitAnswer {
  const derivation = derive(design, { cache });
  const findings = derivation.ok ? derivation.derived.findings : derivation.findings;
  const failing = findings.filter(({ severity }) => severity === 'fail');
  return {
    kind: 'try',
    design,
    refusals: failing.map(({ label, change }) => `${label}. ${change}`),
  };
}

addEventListener('message', ({ data }: MessageEvent<FitQuestion>) => {
  try {
    send({
      answer: data.kind === 'list' ? list(data.design, data.section) : tryOut(data.design),
    });
  } catch (error) {
    send(failureOf(error));
  }
});
