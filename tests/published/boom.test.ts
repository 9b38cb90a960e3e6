import { describe, expect, it } from 'vitest';
import { fieldRateFromBand } from '../../shared/formulas/field-rate-from-band.ts';
import { flowForGallonsPerAcre } from '../../shared/formulas/flow-for-gallons-per-acre.ts';
import { flowFromCatch } from '../../shared/formulas/flow-from-catch.ts';
import { gallonsPerAcreFromFlow } from '../../shared/formulas/gallons-per-acre-from-flow.ts';
import { rateAtNewSpeed } from '../../shared/formulas/rate-at-new-speed.ts';
import { secondsOverCourse } from '../../shared/formulas/seconds-over-course.ts';
import { speedOverCourse } from '../../shared/formulas/speed-over-course.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import { asPrinted, printedText } from './as-printed.ts';
import type { Disagreement, Example } from './example.ts';

// Sources, named as they name themselves.
const albany = 'Calibrating Your Sprayer, Albany County (Wyoming) Weed and Pest Control District';
const manual = 'Tow-behind sprayer owner manual, Appendix A, boom spray calibration tables (equipment manual)';
const otherManual = 'An equipment manual (speed table)';
const northCarolina = 'The Calibration of Turfgrass and Boom Sprayers and Spreaders, NC State Extension';
const cornell = 'Boom Sprayer Calibration worksheet, Cornell University (inputs read, answer ours)';
const console = 'Console calibration: band application (equipment manual)';
const magazine = 'How to Calibrate Herbicide Application Equipment, T&D World magazine, 2014';
const worksheets = 'Sprayer / spreader operator manual, calibration worksheets (equipment manual)';
const nebraska = 'Math for Pesticide Applicators, University of Nebraska-Lincoln Pesticide Education';

const inches = (value: number) => quantity(value, 'in');
const mph = (value: number) => quantity(value, 'mph');
const gallons = (gpm: string, speed: number, spacing: number) =>
  gallonsPerAcreFromFlow({ flow: quantity(gpm, 'gal/min'), speed: mph(speed), spacing: inches(spacing) });
const seconds = (speed: number, feet: number) => secondsOverCourse({ course: quantity(feet, 'ft'), speed: mph(speed) });

const examples: readonly Example[] = [
  {
    what: '480 fl oz a minute over 222 in at 5 mph',
    source: albany,
    computed: () =>
      gallonsPerAcreFromFlow({
        flow: flowFromCatch({ caught: quantity(480, 'fl-oz'), time: quantity(1, 'min') }),
        speed: mph(5),
        spacing: inches(222),
      }),
    printed: { value: '20', unit: 'gal/acre', step: '1' },
  },
  {
    what: '0.8 gal a minute on 20 in at 3 mph',
    source: manual,
    computed: () => gallons('0.8', 3, 20),
    printed: { value: '79.2', unit: 'gal/acre', step: '0.1' },
  },
  {
    what: '0.8 gal a minute on 20 in at 5 mph',
    source: manual,
    computed: () => gallons('0.8', 5, 20),
    printed: { value: '47.5', unit: 'gal/acre', step: '0.1' },
  },
  {
    what: '0.8 gal a minute on 20 in at 6 mph',
    source: manual,
    computed: () => gallons('0.8', 6, 20),
    printed: { value: '39.6', unit: 'gal/acre', step: '0.1' },
  },
  {
    what: '0.8 gal a minute on 20 in at 10 mph',
    source: manual,
    computed: () => gallons('0.8', 10, 20),
    printed: { value: '23.8', unit: 'gal/acre', step: '0.1' },
  },
  {
    what: '20 gal an acre at 3 mph, at 6 mph',
    source: northCarolina,
    computed: () => rateAtNewSpeed({ rate: quantity(20, 'gal/acre'), oldSpeed: mph(3), newSpeed: mph(6) }),
    printed: { value: '10', unit: 'gal/acre' },
  },
  {
    what: 'flow for 20 gal an acre at 4 mph on 20 in',
    source: cornell,
    computed: () => flowForGallonsPerAcre({ rate: quantity(20, 'gal/acre'), speed: mph(4), spacing: inches(20) }),
    printed: { value: '0.27', unit: 'gal/min', step: '0.01' },
  },
  {
    what: '20 gal an acre in a 14 in band on 40 in rows',
    source: console,
    computed: () => fieldRateFromBand({ rate: quantity(20, 'gal/acre'), band: inches(14), row: inches(40) }),
    printed: { value: '7', unit: 'gal/acre' },
  },
  {
    what: '150 ft in 19.7 s',
    source: worksheets,
    computed: () => speedOverCourse({ course: quantity(150, 'ft'), time: quantity('19.7', 's') }),
    printed: { value: '5.2', unit: 'mph', step: '0.1' },
  },
  {
    what: '88 ft in a minute',
    source: nebraska,
    computed: () => speedOverCourse({ course: quantity(88, 'ft'), time: quantity(1, 'min') }),
    printed: { value: '1', unit: 'mph' },
  },
  {
    what: '100 ft at 1 mph, in seconds',
    source: manual,
    computed: () => seconds(1, 100),
    printed: { value: '68', unit: 's', step: '1' },
  },
  {
    what: '300 ft at 1 mph, in seconds',
    source: manual,
    computed: () => seconds(1, 300),
    printed: { value: '205', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 2 mph, in seconds',
    source: manual,
    computed: () => seconds(2, 200),
    printed: { value: '68', unit: 's', step: '1' },
  },
  {
    what: '300 ft at 2 mph, in seconds',
    source: manual,
    computed: () => seconds(2, 300),
    printed: { value: '102', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 3 mph, in seconds',
    source: manual,
    computed: () => seconds(3, 200),
    printed: { value: '45', unit: 's', step: '1' },
  },
  {
    what: '100 ft at 4 mph, in seconds',
    source: manual,
    computed: () => seconds(4, 100),
    printed: { value: '17', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 4 mph, in seconds',
    source: manual,
    computed: () => seconds(4, 200),
    printed: { value: '34', unit: 's', step: '1' },
  },
  {
    what: '100 ft at 5 mph, in seconds',
    source: manual,
    computed: () => seconds(5, 100),
    printed: { value: '14', unit: 's', step: '1' },
  },
  {
    what: '300 ft at 5 mph, in seconds',
    source: manual,
    computed: () => seconds(5, 300),
    printed: { value: '41', unit: 's', step: '1' },
  },
  {
    what: '100 ft at 6 mph, in seconds',
    source: manual,
    computed: () => seconds(6, 100),
    printed: { value: '11', unit: 's', step: '1' },
  },
  {
    what: '300 ft at 6 mph, in seconds',
    source: manual,
    computed: () => seconds(6, 300),
    printed: { value: '34', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 4 mph, in seconds',
    source: magazine,
    computed: () => seconds(4, 200),
    printed: { value: '34', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 5 mph, in seconds',
    source: magazine,
    computed: () => seconds(5, 200),
    printed: { value: '27', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 8 mph, in seconds',
    source: magazine,
    computed: () => seconds(8, 200),
    printed: { value: '17', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 10 mph, in seconds',
    source: magazine,
    computed: () => seconds(10, 200),
    printed: { value: '14', unit: 's', step: '1' },
  },
  {
    what: '200 ft at 12 mph, in seconds',
    source: magazine,
    computed: () => seconds(12, 200),
    printed: { value: '11', unit: 's', step: '1' },
  },
];

// Where a publication and the exact relation differ, the exact relation is followed.
const disagreements: readonly Disagreement[] = [
  {
    what: '200 ft at 5 mph, in seconds',
    source: otherManual,
    computed: () => seconds(5, 200),
    printed: { value: '28', unit: 's', step: '1' },
    ours: { value: '27', unit: 's', step: '1' },
    why: '27.3 s; other tables print 27.',
  },
];

describe('published calibrations of booms', () => {
  it.each(examples)('$what ($source)', ({ computed, printed }) => {
    expect(asPrinted(computed(), printed)).toBe(printedText(printed));
  });

  it.each(disagreements)('$what: printed $printed.value, we follow $ours.value. $why ($source)', (one) => {
    expect(asPrinted(one.computed(), one.ours)).toBe(printedText(one.ours));
    expect(asPrinted(one.computed(), one.printed)).not.toBe(printedText(one.printed));
  });
});
