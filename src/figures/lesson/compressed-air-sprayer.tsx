import { NumberedParts, type NumberedPart } from './numbered-parts.tsx';
import { Wand } from './wand.tsx';

const parts: readonly NumberedPart[] = [
  { name: 'Pump handle; screwed down, it is the carrying handle', at: [86, 22], on: [120, 30] },
  { name: 'Lid with the pump in it, and a gasket below', at: [214, 62], on: [160, 83] },
  { name: 'Relief valve: lets the pressure off', at: [30, 82], on: [83, 108] },
  { name: 'Tank: liquid below, pressed air above', at: [30, 150], on: [98, 158] },
  { name: 'Pump barrel', at: [30, 192], on: [133, 182] },
  { name: 'Dip tube, takes liquid from the bottom', at: [30, 232], on: [177, 226] },
  { name: 'Hose', at: [224, 214], on: [222, 178] },
  { name: 'Shut-off valve; its handle holds a strainer', at: [292, 84], on: [262, 108] },
  { name: 'Wand', at: [322, 142], on: [296, 162] },
  { name: 'Nozzle: strainer, tip and cap', at: [276, 214], on: [319, 210] },
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
      <path d="M190 112C216 112 208 178 222 178S224 98 241 97" className="stroke-ink" strokeWidth="5" fill="none" />
      <Wand x={240} y={96} />
      <path d="M20 240H344" className="stroke-turf" strokeWidth="2.5" />
    </NumberedParts>
  );
}
