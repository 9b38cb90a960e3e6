import type { PlanArrow, PlanDimension, PlanFigure, PlanShape, Point } from '../../shared/contracts/figure.ts';
import { DrawingFrame, drawingWidth, textWidth } from './frame.tsx';
import { groundFill, isHatched, useHatching } from './grounds.tsx';
import { namePlaces } from './name-places.ts';
import { meet, plateBox, type Box } from './boxes.ts';
import { placeDimensions, type PlacedDimension } from './dimension-places.ts';
import { planLayout, type PlanLayout } from './plan-layout.ts';

/** Text on a plate of the paper's own color, kept inside the drawing. */
function Plate({ at, text, bold = false }: { at: Point; text: string; bold?: boolean }) {
  const width = textWidth(text);
  const x = Math.min(Math.max(at[0], width / 2 + 1), drawingWidth - width / 2 - 1);
  return (
    <g>
      <rect x={x - width / 2} y={at[1] - 10} width={width} height="20" rx="2" className="fill-sheet" opacity=".92" />
      <text x={x} y={at[1] + 5} textAnchor="middle" fontWeight={bold ? 600 : 400}>
        {text}
      </text>
    </g>
  );
}

function Outline({
  shape,
  layout,
  className,
  fill,
}: {
  shape: PlanShape<string>;
  layout: PlanLayout;
  className: string;
  fill?: string;
}) {
  const look = { className, fill, strokeWidth: 1.6, strokeLinejoin: 'round' as const };
  if (shape.form === 'circle') {
    const [cx, cy] = layout.at([shape.x, shape.y]);
    return <circle cx={cx} cy={cy} r={shape.radius * layout.scale} {...look} />;
  }
  if (shape.form === 'polygon') {
    return <polygon points={shape.points.map((point) => layout.at(point).join(',')).join(' ')} {...look} />;
  }
  const [x, y] = layout.at([shape.x, shape.y]);
  return <rect x={x} y={y} width={shape.width * layout.scale} height={shape.height * layout.scale} {...look} />;
}

function Dimension({ dimension, placed }: { dimension: PlanDimension<string>; placed: PlacedDimension }) {
  const { from, to, normal, at } = placed;
  const [nx, ny] = normal;
  const tick = ([x, y]: Point) => `M${x - nx * 5} ${y - ny * 5}L${x + nx * 5} ${y + ny * 5}`;
  return (
    <g>
      <path
        d={`M${from.join(' ')}L${to.join(' ')}${tick(from)}${tick(to)}`}
        className="stroke-ink"
        fill="none"
        strokeDasharray={dimension.dashed ? '5 4' : undefined}
      />
      <Plate at={at} text={dimension.text} />
    </g>
  );
}

/** Where an arrow's text stands: beside it, or on it where a dimension's text is in the way. */
function arrowTextAt(arrow: PlanArrow<string>, layout: PlanLayout, taken: readonly Box[]): Point {
  const from = layout.at(arrow.from);
  const to = layout.at(arrow.to);
  const middle: Point = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  const tries = [-14, 0, 14].map((by): Point => [middle[0], middle[1] + by]);
  return tries.find((at) => !taken.some((box) => meet(plateBox(at, arrow.text ?? ''), box, 1))) ?? middle;
}

function Arrow({ arrow, layout, textAt }: { arrow: PlanArrow<string>; layout: PlanLayout; textAt: Point }) {
  const from = layout.at(arrow.from);
  const to = layout.at(arrow.to);
  const angle = (Math.atan2(to[1] - from[1], to[0] - from[0]) * 180) / Math.PI;
  return (
    <g>
      <path d={`M${from.join(' ')}L${to.join(' ')}`} className="stroke-dye" strokeWidth="2" fill="none" />
      <path d="M-11 -6L0 0L-11 6z" className="fill-dye" transform={`translate(${to.join(' ')}) rotate(${angle})`} />
      {arrow.text !== undefined && <Plate at={textAt} text={arrow.text} />}
    </g>
  );
}

/** A plan drawn to scale, with dimension lines. */
export function PlanDrawing({ figure }: { figure: PlanFigure }) {
  const layout = planLayout(figure);
  const hatching = useHatching();
  const placed = placeDimensions({ dimensions: figure.dimensions, shapes: figure.shapes, layout });
  const texts = placed.map(({ at }, index) => plateBox(at, figure.dimensions[index]?.text ?? ''));
  const names = namePlaces({ shapes: figure.shapes, layout, texts });
  return (
    <DrawingFrame height={layout.height} alt={figure.alt}>
      {hatching.defs}
      {figure.shapes.map((shape) => (
        <g key={JSON.stringify(shape)}>
          <Outline shape={shape} layout={layout} className={groundFill[shape.ground]} />
          <Outline
            shape={shape}
            layout={layout}
            className="stroke-ink"
            fill={isHatched(shape.ground) ? hatching.url(shape.ground) : 'none'}
          />
        </g>
      ))}
      {names.map((at, index) => {
        const name = figure.shapes[index]?.name;
        return at && name !== undefined ? <Plate key={`${name} ${at.join(' ')}`} at={at} text={name} bold /> : null;
      })}
      {figure.arrows?.map((arrow) => (
        <Arrow key={JSON.stringify(arrow)} arrow={arrow} layout={layout} textAt={arrowTextAt(arrow, layout, texts)} />
      ))}
      {figure.dimensions.map((dimension, index) => (
        <Dimension key={JSON.stringify(dimension)} dimension={dimension} placed={placed[index] as PlacedDimension} />
      ))}
    </DrawingFrame>
  );
}
