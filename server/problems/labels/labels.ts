import { ambrill50wp } from './ambrill-50wp.ts';
import { bexholmG } from './bexholm-g.ts';
import { dellamar4ec } from './dellamar-4ec.ts';
import { farrowick3sl } from './farrowick-3sl.ts';
import { hadrinelG } from './hadrinel-g.ts';
import { jorvanel2sl } from './jorvanel-2sl.ts';
import { korrin2l } from './korrin-2l.ts';
import { lumeth1g } from './lumeth-1g.ts';
import { murrave2g } from './murrave-2g.ts';
import { nidrelBait } from './nidrel-bait.ts';
import { oskett1ec } from './oskett-1ec.ts';
import { ostrelleSoap } from './ostrelle-soap.ts';
import { pellworthRtu } from './pellworth-rtu.ts';
import { quillane60wg } from './quillane-60wg.ts';
import { sandrilleG } from './sandrille-g.ts';
import { tevlinSc } from './tevlin-sc.ts';
import { trennick4sc } from './trennick-4sc.ts';
import { verrandOil } from './verrand-oil.ts';
import { wrendow3ec } from './wrendow-3ec.ts';
import type { PracticeLabel } from './practice-label.ts';

/** Every practice label. All are invented. */
export const labels: readonly PracticeLabel[] = [
  ambrill50wp,
  bexholmG,
  dellamar4ec,
  farrowick3sl,
  hadrinelG,
  jorvanel2sl,
  korrin2l,
  lumeth1g,
  murrave2g,
  nidrelBait,
  oskett1ec,
  ostrelleSoap,
  pellworthRtu,
  quillane60wg,
  sandrilleG,
  tevlinSc,
  trennick4sc,
  verrandOil,
  wrendow3ec,
];
