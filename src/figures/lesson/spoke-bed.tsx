import { DrawingFrame, drawingWidth } from '../frame.tsx';
import { useHatching } from '../grounds.tsx';

const height = 300;
const center = { x: drawingWidth / 2, y: height / 2 };
const unitsPerFoot = 9;

/** Where the tip of a spoke stands, the first one pointing up, clockwise. */
function tip(index: number, count: number, length: number): readonly [x: number, y: number] {
  const turn = (2 * Math.PI * index) / count - Math.PI / 2;
  return [center.x + Math.cos(turn) * length, center.y + Math.sin(turn) * length];
}

/** A closed line that bends gently through the tips of the spokes. */
function outline(points: readonly (readonly [number, number])[]): string {
  const at = (index: number) => points[(index + points.length) % points.length] ?? [0, 0];
  const curves = points.map((from, index) => {
    const [before, to, after] = [at(index - 1), at(index + 1), at(index + 2)];
    const first = [from[0] + (to[0] - before[0]) / 6, from[1] + (to[1] - before[1]) / 6];
    const second = [to[0] - (after[0] - from[0]) / 6, to[1] - (after[1] - from[1]) / 6];
    return `C${first.join(' ')} ${second.join(' ')} ${to.join(' ')}`;
  });
  return `M${at(0).join(' ')}${curves.join('')}z`;
}

/** A bed that is nearly round, measured from one stake along evenly spaced spokes; drawn to scale. */
export function SpokeBed({ spokesFt, alt }: { spokesFt: readonly number[]; alt: string }) {
  const hatching = useHatching();
  const count = spokesFt.length;
  const tips = spokesFt.map((spokeFt, index) => tip(index, count, spokeFt * unitsPerFoot));
  const edge = outline(tips);
  return (
    <DrawingFrame height={height} alt={alt}>
      {hatching.defs}
      <path d={edge} className="fill-brass-wash" />
      <path d={edge} fill={hatching.url('bed')} className="stroke-ink" strokeWidth="1.6" />
      {tips.map(([x, y]) => (
        <path key={`${x} ${y}`} d={`M${center.x} ${center.y}L${x} ${y}`} className="stroke-ink" strokeDasharray="5 4" />
      ))}
      <circle cx={center.x} cy={center.y} r="4.5" className="fill-ink" />
      {spokesFt.map((spokeFt, index) => {
        const [x, y] = tip(index, count, spokeFt * unitsPerFoot + 17);
        return (
          <text key={`${x} ${y}`} x={x} y={y + 5} textAnchor="middle">
            {spokeFt}
          </text>
        );
      })}
    </DrawingFrame>
  );
}
