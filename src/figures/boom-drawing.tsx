import type { BoomFigure } from '../../shared/contracts/figure.ts';
import { DrawingFrame, drawingWidth, textWidth } from './frame.tsx';

const boomY = 64;
const groundY = 168;
/** More nozzles than this do not fit side by side; the boom then runs on in dashes. */
const mostShown = 12;

/** A boom seen from the front: its nozzles, as many as there are, at their spacing, spray to the ground, what is known written beside. */
export function BoomDrawing({ figure }: { figure: BoomFigure }) {
  const shown = Math.min(Math.max(figure.nozzles, 2), mostShown);
  const runsOn = figure.nozzles > mostShown;
  const span = drawingWidth - 90;
  const step = span / shown;
  const xs = Array.from({ length: shown }, (_, index) => 45 + step * (index + 0.5));
  const [first = 0, second = 0] = xs;
  const half = Math.min(6, step * 0.3);
  const notes = [figure.flow, figure.speed].filter((text) => text !== undefined);
  return (
    <DrawingFrame height={groundY + 14 + notes.length * 22} alt={figure.alt}>
      <path d={`M${first} 30H${second}M${first} 24V52M${second} 24V52`} className="stroke-ink" fill="none" />
      <rect
        x={(first + second) / 2 - textWidth(figure.spacing) / 2}
        y="4"
        width={textWidth(figure.spacing)}
        height="19"
        className="fill-sheet"
      />
      <text x={(first + second) / 2} y="19" textAnchor="middle">
        {figure.spacing}
      </text>
      <rect x="30" y={boomY - 6} width={drawingWidth - 60} height="9" rx="3" className="fill-rule-strong" />
      {runsOn && (
        <path
          d={`M${drawingWidth - 30} ${boomY - 1.5}H${drawingWidth}`}
          className="stroke-rule-strong"
          strokeWidth="9"
          strokeDasharray="6 5"
        />
      )}
      {xs.map((x) => (
        <g key={x}>
          <path
            d={`M${x} ${boomY + 16}L${x - step * 0.62} ${groundY}H${x + step * 0.62}z`}
            className="fill-dye"
            opacity=".2"
          />
          <path
            d={`M${x - half} ${boomY + 3}h${half * 2}v8l${-half / 2} 5h${-half}l${-half / 2}-5z`}
            className="fill-sheet stroke-ink"
            strokeWidth="1.5"
          />
        </g>
      ))}
      <path d={`M12 ${groundY}H${drawingWidth - 12}`} className="stroke-turf" strokeWidth="3" />
      {notes.map((text, index) => (
        <text key={text} x="30" y={groundY + 22 + index * 22}>
          {text}
        </text>
      ))}
    </DrawingFrame>
  );
}
