/** One measured figure beside its bar. `atLeast` says on which side of the bar it must lie. */
export interface BenchFigure {
  name: string;
  figure: number;
  unit: string;
  bar: number;
  atLeast: boolean;
}

export interface BenchLine {
  name: string;
  figure: number;
  unit: string;
  bar: number;
  ok: boolean;
}

/** Three significant digits are all a timing is worth. */
function threeDigits(value: number): number {
  return value === 0 ? 0 : Number(value.toPrecision(3));
}

export function benchLine({ name, figure, unit, bar, atLeast }: BenchFigure): BenchLine {
  return { name, figure: threeDigits(figure), unit, bar, ok: atLeast ? figure >= bar : figure <= bar };
}

/** The middle of some values; 0 when there are none. */
export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  if (sorted.length === 0) return 0;
  return sorted.length % 2 === 1
    ? (sorted[middle] as number)
    : ((sorted[middle - 1] as number) + (sorted[middle] as number)) / 2;
}
