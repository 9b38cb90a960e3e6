import { NumberedParts, type NumberedPart } from './numbered-parts.tsx';

const parts: readonly NumberedPart[] = [
  { name: 'Pump handle, screwed down it is the carrying handle', at: [86, 22], on: [120, 30] },
  { name: 'Lid with the pump in it, and a gasket below', at: [214, 62], on: [176, 80] },
  { name: 'Relief valve: lets the pressure off', at: [30, 82], on: [83, 108] },
  { name: 'Tank: liquid below, pressed air above', at: [30, 150], on: [98, 158] },
  { name: 'Pump barrel', at: [30, 200], on: [133, 182] },
  { name: 'Dip tube, takes liquid from the bottom', at: [220, 226], on: [177, 218] },
  { name: 'Hose', at: [216, 130], on: [231, 158] },
  { name: 'Shut-off valve; its handle holds a strainer', at: [310, 206], on: [274, 196] },
  { name: 'Wand', at: [262, 112], on: [298, 128] },
  { name: 'Nozzle: strainer, tip and cap', at: [296, 34], on: [325, 68] },
];

/** A compressed-air hand sprayer, cut open, from the side. */
export function CompressedAirSprayer() {
  return (
    <NumberedParts title="Compressed-air sprayer" height={258} parts={parts}>
      <path d="M91 156h98v70q0 10 -10 10h-78q-10 0 -10 -10z" className="fill-dye" opacity=".3" />
      <path
        d="M90 108q0 -14 14 -14h72q14 0 14 14v118q0 12 -12 12h-76q-12 0 -12 -12z"
        className="fill-none stroke-ink"
        strokeWidth="2.2"
      />
      <path d="M98 94L84 72h112l-14 22" className="fill-none stroke-ink" strokeWidth="2" strokeLinejoin="round" />
      <path d="M133 88h14v112h-14z" className="fill-sheet stroke-ink" strokeWidth="1.6" />
      <path d="M112 76h56v14h-56z" className="fill-rule stroke-ink" strokeWidth="1.6" />
      <path d="M140 76V34M140 88v60M134 148h12" className="stroke-ink" strokeWidth="3" />
      <path d="M110 32h60" className="stroke-ink" strokeWidth="9" strokeLinecap="round" />
      <path d="M90 108h-10M80 102v12" className="stroke-ink" strokeWidth="4" />
      <path d="M190 112h-13V230" className="stroke-ink" strokeWidth="3.5" fill="none" opacity=".75" />
      <path d="M190 112q34 -4 40 44q6 52 34 48" className="stroke-ink" strokeWidth="5" fill="none" />
      <path d="M261 206l20 -32l9 5l-19 33z" className="fill-rule stroke-ink" strokeWidth="1.6" strokeLinejoin="round" />
      <path d="M266 194q-6 -12 6 -26" className="stroke-ink" strokeWidth="3" fill="none" strokeLinecap="round" />
      <path d="M286 175L318 86q4 -12 10 -18" className="stroke-ink" strokeWidth="4.5" fill="none" />
      <path d="M322 70l9 -9l8 8l-9 9z" className="fill-rule stroke-ink" strokeWidth="1.6" />
      <path d="M336 62l11 -16M338 64l13 -8M335 60l5 -18" className="stroke-dye" strokeWidth="1.6" />
      <path d="M20 240H330" className="stroke-turf" strokeWidth="2.5" />
    </NumberedParts>
  );
}
