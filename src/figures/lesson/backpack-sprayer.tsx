import { NumberedParts, type NumberedPart } from './numbered-parts.tsx';

const parts: readonly NumberedPart[] = [
  { name: 'Lid, with a small hole that lets air in', at: [116, 26], on: [156, 38] },
  { name: 'Filler strainer, a basket in the neck', at: [228, 46], on: [190, 74] },
  { name: 'Tank with its marks', at: [246, 92], on: [214, 104] },
  { name: 'Straps and back pad', at: [56, 92], on: [97, 112] },
  { name: 'Pump lever', at: [26, 164], on: [38, 190] },
  { name: 'Pump, with the pressure chamber in the tank', at: [56, 138], on: [164, 158] },
  { name: 'Hose', at: [214, 246], on: [234, 224] },
  { name: 'Shut-off valve; its handle holds a strainer', at: [312, 214], on: [276, 196] },
  { name: 'Pressure regulator, on some a gauge', at: [318, 164], on: [292, 166] },
  { name: 'Wand', at: [276, 108], on: [309, 120] },
  { name: 'Nozzle: strainer, tip and cap', at: [300, 34], on: [332, 68] },
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
      <path d="M214 218q14 8 28 4q16 -6 22 -20" className="stroke-ink" strokeWidth="5" fill="none" />
      <path d="M261 206l20 -32l9 5l-19 33z" className="fill-rule stroke-ink" strokeWidth="1.6" strokeLinejoin="round" />
      <path d="M266 194q-6 -12 6 -26" className="stroke-ink" strokeWidth="3" fill="none" strokeLinecap="round" />
      <path d="M283 172l6 -14l11 5l-7 14z" className="fill-sheet stroke-ink" strokeWidth="1.8" strokeLinejoin="round" />
      <path d="M295 160L325 86q4 -12 10 -18" className="stroke-ink" strokeWidth="4.5" fill="none" />
      <path d="M329 70l9 -9l8 8l-9 9z" className="fill-rule stroke-ink" strokeWidth="1.6" />
      <path d="M342 58l4 -18M344 62l5 -8" className="stroke-dye" strokeWidth="1.6" />
      <path d="M20 228H340" className="stroke-turf" strokeWidth="2.5" />
    </NumberedParts>
  );
}
