import type { AttemptView, PartView, ProblemView } from '../../shared/contracts/practice.ts';

const base = {
  topic: 'area' as const,
  state: 'open' as const,
  attempts: [],
  hints: [],
  hintsLeft: 3,
  answerText: null,
};

export function buildNumberPart(changes: Partial<Extract<PartView, { kind: 'number' }>> = {}): PartView {
  return {
    ...base,
    kind: 'number',
    key: 'a',
    ask: 'What area is sprayed?',
    units: [
      { key: 'sq-ft', symbol: 'sq ft' },
      { key: 'acre', symbol: 'acre' },
    ],
    rounding: 'to the nearest whole square foot',
    ...changes,
  };
}

export function buildOrderPart(changes: Partial<Extract<PartView, { kind: 'order' }>> = {}): PartView {
  return {
    ...base,
    kind: 'order',
    key: 'a',
    ask: 'In what order do you fill the tank?',
    steps: [
      { key: 'product', text: 'Add the product' },
      { key: 'water', text: 'Fill half with water' },
      { key: 'rest', text: 'Add the rest of the water' },
    ],
    ...changes,
  };
}

export function buildAttempt(changes: Partial<AttemptView> = {}): AttemptView {
  return {
    typed: '1800',
    read: '1,800 sq ft',
    verdict: 'slip',
    slip: 'left-in-obstacle',
    headline: 'The patio is still in your area.',
    detail: 'Take off 20 ft × 10 ft = 200 sq ft.',
    counts: true,
    ...changes,
  };
}

/** A problem as the server shows it, for tests of the client. */
export function buildProblemView(changes: Partial<ProblemView> = {}): ProblemView {
  return {
    id: '0197f0a0-0000-7000-8000-0000000000aa',
    topic: 'area',
    tier: 2,
    heading: 'Weed control on a back lawn',
    statement: 'Wanjiru sprays the whole back lawn, but not the patio.',
    figure: null,
    label: null,
    parts: [buildNumberPart()],
    working: null,
    state: 'open',
    drill: null,
    locale: 'en',
    ...changes,
  };
}
