import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type ChoicePart, type Slip } from '../../family.ts';
import { makeRng, type Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, type Scene } from '../../situations.ts';
import type { WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { placesWithField } from '../places-with-field.ts';
import { equipmentNames } from './equipment-names.ts';
import type { EquipmentCase } from './equipment-rule.ts';
import { largerJobs } from './larger-jobs.ts';
import { smallJobs } from './small-jobs.ts';

interface Given extends Scene {
  readonly rule: string;
  readonly size: number;
  readonly telling: number;
}

const rules = [...smallJobs, ...largerJobs];

function caseOf(g: Given): EquipmentCase {
  const rule = rules.find(({ key }) => key === g.rule);
  if (!rule) throw new RangeError(`no rule ${g.rule}`);
  return rule.at(g.size, g.telling);
}

const openings = 4;

function draw(rng: Rng, tier: Tier): Given {
  const rule = rng.pick(rules.filter((one) => one.tier === tier));
  const drawn = drawScene(rng, openings);
  const scene = rule.largeGrounds ? { ...drawn, place: rng.pick(placesWithField) } : drawn;
  return { ...scene, rule: rule.key, size: rule.size(rng), telling: rng.int(0, rule.tellings - 1) };
}

function statement(g: Given): Text {
  const opening = [
    both(en`${g.person} plans a job ${g.place.at}.`, es`${g.person} planea un trabajo ${g.place.at}.`),
    both(en`The crew is due ${g.place.at} ${g.season}.`, es`La cuadrilla va a trabajar ${g.place.at} ${g.season}.`),
    both(en`${g.person} walks the grounds ${g.place.of}.`, es`${g.person} recorre los terrenos ${g.place.of}.`),
    both(en`The next stop is ${g.place.the}.`, es`La próxima parada es ${g.place.the}.`),
  ][g.situation];
  const { job } = caseOf(g);
  return both(en`${opening ?? ''} ${job}`, es`${opening ?? ''} ${job}`);
}

function part(g: Given): ChoicePart {
  const { right, why, wrong } = caseOf(g);
  return {
    kind: 'choice',
    key: 'a',
    topic: 'equipment',
    ask: both('Which equipment suits this job best?', '¿Qué equipo conviene más para este trabajo?'),
    options: [
      { key: right, text: equipmentNames[right], right: true, reason: why },
      ...wrong.map(({ equipment, slip, reason }) => ({
        key: equipment,
        text: equipmentNames[equipment],
        right: false,
        slip,
        reason,
      })),
    ],
  };
}

function working(g: Given): readonly WorkingLine[] {
  const lines = part(g).options.map(({ text, reason, right }) => ({ name: text, reason, answers: right }));
  return [...lines.filter(({ answers }) => !answers), ...lines.filter(({ answers }) => answers)];
}

const samples = rules.map((rule) => rule.at(rule.size(makeRng(rule.key)), 0));
const slips: readonly Slip<Given>[] = [...new Set(samples.flatMap(({ wrong }) => wrong.map(({ slip }) => slip)))].map(
  (key) => ({
    key,
    part: 'a',
    message: (g) => part(g).options.find((option) => option.slip === key)?.reason ?? both('', ''),
  }),
);

export const chooseEquipmentFamily = defineFamily<Given>({
  key: 'choose-equipment',
  version: 1,
  topic: 'equipment',
  tiers: [1, 2],
  title: both('Equipment for a job', 'Equipo para un trabajo'),
  sources: [
    { title: 'Pesticide Application Equipment', publisher: 'British Columbia Ministry of Agriculture', year: null },
    {
      title: 'How do I calibrate a hose-end sprayer?',
      publisher: 'Pesticide Environmental Stewardship (land-grant university consortium)',
      year: null,
    },
    { title: 'Drop Spreader Calibration (Louisiana Home Lawn Series)', publisher: 'LSU AgCenter', year: null },
  ],
  draw,
  heading: () => both('What to take off the truck', 'Qué bajar de la camioneta'),
  statement,
  parts: (g) => [part(g)],
  hints: () => [
    both(
      'You are asked for equipment. Four things decide: the form of the product, the size of the job, how far the spray must reach, and what stands near.',
      'Se pide un equipo. Deciden cuatro cosas: la forma del producto, el tamaño del trabajo, hasta dónde debe llegar y qué hay cerca.',
    ),
    both(
      'Begin with the form. Dry granules need a spreader, a liquid or powder in water a sprayer, a ready product its own container, a bait its station.',
      'Empiece por la forma. Los gránulos secos piden esparcidor; un líquido o polvo en agua, rociador; un producto listo, su envase; un cebo, su cebadero.',
    ),
    both(
      'Then the size: how many fills would it take? And the edges: could it reach, fit and stay off what must not be treated?',
      'Después el tamaño: ¿cuántas cargas serían? Y las orillas: ¿llega, cabe y no toca lo que no se trata?',
    ),
  ],
  working,
  slips,
});
