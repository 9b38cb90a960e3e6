import { fireEvent, render, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { AreaLessObstacle } from './area-less-obstacle.tsx';
import { OffsetSteps } from './offset-steps.tsx';
import { RadiusAndDiameter } from './radius-and-diameter.tsx';
import { RateAndArea } from './rate-and-area.tsx';
import { SwathAndPlot } from './swath-and-plot.tsx';

const slide = (label: string, value: number) =>
  fireEvent.change(screen.getByRole('slider', { name: new RegExp(label) }), { target: { value: String(value) } });
const result = () => screen.getByRole('status').textContent;

it('makes the plot of 1/128 acre shorter as the swath gets wider', () => {
  render(<SwathAndPlot />);
  expect(result()).toContain('340 sq ft ÷ 4 ft = 85 ft');
  slide('Swath width', 5);
  expect(result()).toContain('340 sq ft ÷ 5 ft = 68 ft');
  expect(screen.getByRole('slider').getAttribute('aria-valuetext')).toBe('5 ft');
  expect(screen.getByRole('img').getAttribute('aria-label')).toMatch(/5 feet wide and 68 feet long/);
});

it('finds a circle from half the distance across', () => {
  render(<RadiusAndDiameter />);
  slide('Distance across', 20);
  expect(result()).toContain('314 sq ft');
  expect(document.body.textContent).toMatch(/1,256\s+sq ft/);
});

it('takes the patio off the lawn', () => {
  render(<AreaLessObstacle />);
  slide('Length of the patio', 30);
  expect(result()).toContain('1,800 sq ft − 300 sq ft = 1,500 sq ft');
});

it('counts the thousands of a lawn once each', () => {
  render(<RateAndArea />);
  slide('Area of the lawn', 6000);
  expect(result()).toMatch(/6 × 1\.5 fl oz = 9 fl oz/);
});

it('comes nearer to the lawn with a shorter step', () => {
  render(<OffsetSteps />);
  const foundSqFt = () => Number(/= ([\d,]+) sq ft/.exec(result() ?? '')?.[1]?.replaceAll(',', ''));
  const lawnSqFt = Number(/holds ([\d,]+) sq ft/.exec(document.body.textContent ?? '')?.[1]?.replaceAll(',', ''));
  const long = Math.abs(foundSqFt() - lawnSqFt);
  slide('Step', 4);
  expect(Math.abs(foundSqFt() - lawnSqFt)).toBeLessThan(long / 5);
});
