import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convert, quantity, ratio, type Quantity } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import type { UnitKey } from '../quantity/units.ts';
import { flowAtPressure } from './flow-at-pressure.ts';
import { flowForGallonsPerAcre } from './flow-for-gallons-per-acre.ts';
import { flowFromCatch } from './flow-from-catch.ts';
import { gallonsPerAcreFrom128th, oneOf128Acre } from './gallons-per-acre-from-128th.ts';
import { gallonsPerAcreFromFlow } from './gallons-per-acre-from-flow.ts';
import { pressureForFlow } from './pressure-for-flow.ts';
import { rateAtNewSpeed } from './rate-at-new-speed.ts';
import { rateFromTestPlot } from './rate-from-test-plot.ts';
import { secondsOverCourse } from './seconds-over-course.ts';
import { speedOverCourse } from './speed-over-course.ts';
import { testPlotLength } from './test-plot-length.ts';

const q = (value: number | string, unit: UnitKey) => quantity(value, unit);
/** Value and unit, to compare exactly. */
const written = (one: Quantity) => `${one.value.toFraction()} ${one.unit}`;
const some = fc.integer({ min: 1, max: 2000 });

describe('rate, flow and speed of a boom', () => {
  it('0.3 gal per minute at 4 mph on 20 in is 22.275 gal an acre', () => {
    const boom = { flow: q('0.3', 'gal/min'), speed: q(4, 'mph'), spacing: q(20, 'in') };
    expect(written(gallonsPerAcreFromFlow(boom))).toBe(written(q('22.275', 'gal/acre')));
  });

  it('5,940 follows from the units: the volume of a minute over the ground of a minute', () => {
    fc.assert(
      fc.property(some, some, some, (flow, speed, spacing) => {
        const boom = { flow: q(flow, 'gal/min'), speed: q(speed, 'mph'), spacing: q(spacing, 'in') };
        const feet = convert(boom.speed, 'ft/min').value;
        const area = quantity(feet.mul(convert(boom.spacing, 'ft').value), 'sq-ft');
        const used = quantity(boom.flow.value, 'gal');
        expect(written(gallonsPerAcreFromFlow(boom))).toBe(written(rateFromTestPlot({ used, area, unit: 'gal/acre' })));
      }),
    );
  });

  it('the flow for a rate gives that rate again', () => {
    fc.assert(
      fc.property(some, some, some, (rate, speed, spacing) => {
        const wanted = { rate: q(rate, 'gal/acre'), speed: q(speed, 'mph'), spacing: q(spacing, 'in') };
        const flow = flowForGallonsPerAcre(wanted);
        expect(written(gallonsPerAcreFromFlow({ flow, speed: wanted.speed, spacing: wanted.spacing }))).toBe(
          written(wanted.rate),
        );
      }),
    );
  });

  it('speed and seconds over a course are each other turned round', () => {
    expect(written(speedOverCourse({ course: q(88, 'ft'), time: q(60, 's') }))).toBe(written(q(1, 'mph')));
    fc.assert(
      fc.property(some, some, (feet, seconds) => {
        const course = q(feet, 'ft');
        const speed = speedOverCourse({ course, time: q(seconds, 's') });
        expect(written(secondsOverCourse({ course, speed }))).toBe(written(q(seconds, 's')));
      }),
    );
  });

  it('a catch of 32 fl oz in 30 s is half a gallon a minute', () => {
    expect(written(flowFromCatch({ caught: q(32, 'fl-oz'), time: q(30, 's') }))).toBe(written(q('0.5', 'gal/min')));
  });

  it('twice the speed is half the rate', () => {
    const change = { rate: q(20, 'gal/acre'), oldSpeed: q(3, 'mph'), newSpeed: q(6, 'mph') };
    expect(written(rateAtNewSpeed(change))).toBe(written(q(10, 'gal/acre')));
  });
});

describe('pressure and flow', () => {
  it('four times the pressure is twice the flow', () => {
    const change = { flow: q('0.4', 'gal/min'), oldPressure: q(10, 'psi'), newPressure: q(40, 'psi') };
    expect(written(flowAtPressure({ ...change, step: rational('0.01') }))).toBe(written(q('0.8', 'gal/min')));
  });

  it('the rounded flow lies within half a step of the root', () => {
    const step = rational('0.001');
    fc.assert(
      fc.property(some, some, some, (flow, before, after) => {
        const change = { flow: q(flow, 'gal/min'), oldPressure: q(before, 'psi'), newPressure: q(after, 'psi') };
        const found = flowAtPressure({ ...change, step }).value;
        const squared = change.flow.value.mul(change.flow.value).mul(ratio(change.newPressure, change.oldPressure));
        const below = found.sub(step.div(2));
        const above = found.add(step.div(2));
        expect(below.compare(0) < 0 || below.mul(below).compare(squared) <= 0).toBe(true);
        expect(above.mul(above).compare(squared)).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it('the pressure for a flow goes with its square', () => {
    const change = { pressure: q(20, 'psi'), oldFlow: q('0.2', 'gal/min'), newFlow: q('0.3', 'gal/min') };
    expect(written(pressureForFlow(change))).toBe(written(q(45, 'psi')));
  });
});

describe('test plots', () => {
  it('ounces on the exact 1/128 acre are gallons on an acre', () => {
    fc.assert(
      fc.property(some, (ounces) => {
        const caught = q(ounces, 'fl-oz');
        const onPlot = rateFromTestPlot({ used: caught, area: oneOf128Acre, unit: 'gal/acre' });
        expect(written(gallonsPerAcreFrom128th({ caught }))).toBe(written(onPlot));
      }),
    );
  });

  it('1.5 gal on 500 sq ft is 3 gal per 1,000 sq ft', () => {
    const test = { used: q('1.5', 'gal'), area: q(500, 'sq-ft') };
    expect(written(rateFromTestPlot({ ...test, unit: 'gal/1000-sq-ft' }))).toBe(written(q(3, 'gal/1000-sq-ft')));
  });

  it('340 sq ft at 4 ft wide is 85 ft long', () => {
    expect(written(testPlotLength({ area: q(340, 'sq-ft'), width: q(48, 'in') }))).toBe(written(q(85, 'ft')));
  });
});

describe('what has no meaning is refused', () => {
  const none = q(0, 'gal/min');
  it.each([
    ['no flow', () => gallonsPerAcreFromFlow({ flow: none, speed: q(4, 'mph'), spacing: q(20, 'in') })],
    [
      'a length for a speed',
      () => gallonsPerAcreFromFlow({ flow: q(1, 'gal/min'), speed: q(4, 'ft'), spacing: q(20, 'in') }),
    ],
    ['no rate', () => flowForGallonsPerAcre({ rate: q(0, 'gal/acre'), speed: q(4, 'mph'), spacing: q(20, 'in') })],
    ['no time', () => flowFromCatch({ caught: q(1, 'fl-oz'), time: q(0, 's') })],
    ['no course', () => speedOverCourse({ course: q(0, 'ft'), time: q(10, 's') })],
    ['no speed', () => secondsOverCourse({ course: q(100, 'ft'), speed: q(0, 'mph') })],
    [
      'a negative speed',
      () => rateAtNewSpeed({ rate: q(20, 'gal/acre'), oldSpeed: q(3, 'mph'), newSpeed: q(-3, 'mph') }),
    ],
    [
      'no step',
      () =>
        flowAtPressure({
          flow: q(1, 'gal/min'),
          oldPressure: q(20, 'psi'),
          newPressure: q(40, 'psi'),
          step: rational(0),
        }),
    ],
    [
      'no pressure',
      () => pressureForFlow({ pressure: q(0, 'psi'), oldFlow: q(1, 'gal/min'), newFlow: q(2, 'gal/min') }),
    ],
    ['nothing caught', () => gallonsPerAcreFrom128th({ caught: q(0, 'fl-oz') })],
    ['no plot', () => rateFromTestPlot({ used: q(1, 'gal'), area: q(0, 'sq-ft'), unit: 'gal/acre' })],
    ['no width', () => testPlotLength({ area: q(340, 'sq-ft'), width: q(0, 'ft') })],
  ])('%s', (_, call) => {
    expect(call).toThrow(RangeError);
  });
});
