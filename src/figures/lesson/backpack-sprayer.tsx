import { NumberedParts, type NumberedPart } from './numbered-parts.tsx';
import { Wand } from './wand.tsx';

const parts: readonly NumberedPart[] = [
  { name: 'Lid, with a small hole that lets air in', at: [116, 26], on: [156, 38] },
  { name: 'Filler strainer, a basket in the neck', at: [228, 46], on: [190, 74] },
  { name: 'Tank with its marks', at: [182, 110], on: [210, 104] },
  { name: 'Straps and back pad', at: [56, 92], on: [97, 112] },
  { name: 'Pump lever', at: [26, 164], on: [38, 190] },
  { name: 'Pump, with the pressure chamber in the tank', at: [56, 138], on: [164, 158] },
  { name: 'Hose', at: [262, 176], on: [236, 150] },
  { name: 'Shut-off valve; its handle holds a strainer', at: [300, 72], on: [266, 96] },
  { name: 'Pressure regulator, on some a gauge', at: [324, 104], on: [280, 120] },
  { name: 'Wand', at: [334, 142], on: [304, 150] },
  { name: 'Nozzle: strainer, tip and cap', at: [284, 204], on: [323, 198] },
];

/** A lever-pumped backpack sprayer, cut open, from the side: the wearer stands at the left. */
export function BackpackSprayer() {
  return (
    <NumberedParts title="Backpack sprayer" height={262} parts={parts}>
      <path
        d="M119 78C92 84 90 150 118 176"
        className="stroke-rule-strong"
        strokeWidth="8"
        fill="none"
        strokeLinecap="round"
      />
      <path d="M119 128H219V190q0 16 -18 16H137q-18 0 -18 -18z" className="fill-dye" opacity=".3" />
      <path
        d="M136 58h66q18 0 18 20v110q0 20 -20 20h-62q-20 0 -20 -22V78q0 -20 18 -20z"
        className="fill-none stroke-ink"
        strokeWidth="2.2"
      />
      <path d="M112 86v84" className="stroke-rule-strong" strokeWidth="6" strokeLinecap="round" />
      <path d="M152 48h44v10h-44z" className="fill-sheet stroke-ink" strokeWidth="1.6" />
      <path d="M146 32h56v16h-56z" className="fill-rule stroke-ink" strokeWidth="1.8" strokeLinejoin="round" />
      <path
        d="M157 58v26q0 6 6 6h22q6 0 6 -6V58M165 60v28M174 60v28M183 60v28M158 69h32M158 79h32"
        className="stroke-ink"
        strokeWidth="1"
        fill="none"
      />
      {[88, 104, 120, 136, 152, 168, 184].map((y) => (
        <path key={y} d={`M220 ${y}h-12`} className="stroke-ink" strokeWidth="1.4" />
      ))}
      <path d="M158 140q0 -12 13 -12t13 12v68h-26z" className="fill-sheet stroke-ink" strokeWidth="1.8" />
      <path d="M126 208h88v18h-88z" className="fill-rule stroke-ink" strokeWidth="1.6" />
      <path d="M171 208v9H118" className="stroke-ink" strokeWidth="3" fill="none" />
      <path
        d="M118 217H74q-16 0 -24 -14L36 186"
        className="stroke-ink"
        strokeWidth="5"
        fill="none"
        strokeLinecap="round"
      />
      <path d="M44 196L33 182" className="stroke-ink" strokeWidth="10" strokeLinecap="round" />
      <path d="M214 218C242 224 236 168 236 144S232 86 245 85" className="stroke-ink" strokeWidth="5" fill="none" />
      <Wand x={244} y={84} regulator />
      <path d="M16 228H348" className="stroke-turf" strokeWidth="2.5" />
    </NumberedParts>
  );
}
