import type { NozzlePatternFigure } from '../../../../shared/contracts/figure.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { both } from '../both.ts';

export type Pattern = NozzlePatternFigure['patterns'][number]['pattern'];

/** Patterns in the order a drawing shows them. */
export const patternOrder: readonly Pattern[] = ['flat-fan', 'even-fan', 'hollow-cone', 'stream', 'flood'];

export const patternNames: Partial<Record<Pattern, Text>> &
  Record<'flat-fan' | 'even-fan' | 'hollow-cone' | 'stream' | 'flood', Text> = {
  'flat-fan': both('Flat fan', 'Abanico plano'),
  'even-fan': both('Even flat fan', 'Abanico uniforme'),
  'hollow-cone': both('Hollow cone', 'Cono hueco'),
  stream: both('Solid stream', 'Chorro sólido'),
  flood: both('Flooding fan', 'Abanico inundador'),
};

export type NamedPattern = keyof typeof patternNames & ('flat-fan' | 'even-fan' | 'hollow-cone' | 'stream' | 'flood');

/** What each pattern lays on the ground, for the text equivalent of the drawing. */
export const patternMarks: Record<NamedPattern, Text> = {
  'flat-fan': both(
    'flat fan: a thin line across, most in the middle and less toward both ends',
    'abanico plano: una línea delgada, con más en el centro y menos hacia las puntas',
  ),
  'even-fan': both(
    'even flat fan: a thin line across with the same amount from end to end',
    'abanico uniforme: una línea delgada con la misma cantidad de punta a punta',
  ),
  'hollow-cone': both(
    'hollow cone: a ring of small drops, little in the middle',
    'cono hueco: un anillo de gotas pequeñas, con poco en el centro',
  ),
  stream: both('solid stream: one narrow jet', 'chorro sólido: un solo chorro angosto'),
  flood: both(
    'flooding fan: a very wide, low sheet of large drops',
    'abanico inundador: una cortina muy ancha y baja de gotas grandes',
  ),
};
