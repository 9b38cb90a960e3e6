import type { UnitKey } from '../../../../shared/quantity/units.ts';
import type { Tier } from '../../../../shared/vocabulary.ts';

/** A change of volume units to practice, with the amounts it is asked for. */
export interface UnitPair {
  readonly from: UnitKey;
  readonly to: UnitKey;
  /** The unit half-way, where the change takes two steps. */
  readonly through?: UnitKey;
  /** Amounts in `from`, exact decimal text: least, most, step. */
  readonly amounts: readonly [least: string, most: string, step: string];
  /** The unit mixed up with one of the two, and with which. */
  readonly mixUp?: { readonly of: 'from' | 'to'; readonly as: UnitKey };
  /** Step the answer is rounded to. */
  readonly answerStep: string;
}

/** Changes of one step, of two steps, and to or from metric units. */
export const unitPairs: Record<Tier, readonly UnitPair[]> = {
  1: [
    { from: 'gal', to: 'fl-oz', amounts: ['0.5', '3', '0.25'], mixUp: { of: 'from', as: 'qt' }, answerStep: '1' },
    { from: 'qt', to: 'fl-oz', amounts: ['0.5', '5', '0.5'], mixUp: { of: 'from', as: 'pt' }, answerStep: '1' },
    { from: 'pt', to: 'fl-oz', amounts: ['0.5', '6', '0.5'], mixUp: { of: 'from', as: 'cup' }, answerStep: '1' },
    { from: 'cup', to: 'fl-oz', amounts: ['0.5', '6', '0.5'], mixUp: { of: 'from', as: 'pt' }, answerStep: '1' },
    { from: 'gal', to: 'qt', amounts: ['1.5', '12', '0.5'], mixUp: { of: 'to', as: 'pt' }, answerStep: '1' },
    { from: 'gal', to: 'pt', amounts: ['0.5', '6', '0.5'], mixUp: { of: 'to', as: 'qt' }, answerStep: '1' },
    { from: 'fl-oz', to: 'tbsp', amounts: ['1.5', '8', '0.5'], answerStep: '1' },
    { from: 'tbsp', to: 'tsp', amounts: ['2', '9', '1'], answerStep: '1' },
    { from: 'fl-oz', to: 'qt', amounts: ['24', '160', '8'], mixUp: { of: 'to', as: 'pt' }, answerStep: '0.01' },
    { from: 'fl-oz', to: 'pt', amounts: ['12', '96', '4'], mixUp: { of: 'to', as: 'cup' }, answerStep: '0.01' },
    { from: 'qt', to: 'gal', amounts: ['3', '30', '1'], mixUp: { of: 'from', as: 'pt' }, answerStep: '0.01' },
  ],
  2: [
    {
      from: 'cup',
      to: 'tbsp',
      through: 'fl-oz',
      amounts: ['0.75', '3', '0.25'],
      mixUp: { of: 'from', as: 'pt' },
      answerStep: '1',
    },
    {
      from: 'pt',
      to: 'tbsp',
      through: 'fl-oz',
      amounts: ['0.5', '2', '0.25'],
      mixUp: { of: 'from', as: 'cup' },
      answerStep: '1',
    },
    { from: 'fl-oz', to: 'tsp', through: 'tbsp', amounts: ['1.5', '6', '0.5'], answerStep: '1' },
    {
      from: 'qt',
      to: 'cup',
      through: 'pt',
      amounts: ['1.5', '8', '0.5'],
      mixUp: { of: 'from', as: 'gal' },
      answerStep: '1',
    },
    {
      from: 'gal',
      to: 'cup',
      through: 'qt',
      amounts: ['0.5', '4', '0.25'],
      mixUp: { of: 'to', as: 'pt' },
      answerStep: '1',
    },
    {
      from: 'tbsp',
      to: 'cup',
      through: 'fl-oz',
      amounts: ['6', '40', '2'],
      mixUp: { of: 'to', as: 'pt' },
      answerStep: '0.1',
    },
    {
      from: 'tbsp',
      to: 'pt',
      through: 'fl-oz',
      amounts: ['12', '64', '4'],
      mixUp: { of: 'to', as: 'cup' },
      answerStep: '0.1',
    },
    { from: 'tsp', to: 'fl-oz', through: 'tbsp', amounts: ['8', '45', '1'], answerStep: '0.1' },
    {
      from: 'fl-oz',
      to: 'gal',
      through: 'qt',
      amounts: ['80', '400', '10'],
      mixUp: { of: 'to', as: 'pt' },
      answerStep: '0.1',
    },
  ],
  3: [
    {
      from: 'cup',
      to: 'ml',
      through: 'fl-oz',
      amounts: ['0.75', '4', '0.25'],
      mixUp: { of: 'from', as: 'pt' },
      answerStep: '1',
    },
    {
      from: 'pt',
      to: 'ml',
      through: 'fl-oz',
      amounts: ['0.5', '4', '0.25'],
      mixUp: { of: 'from', as: 'cup' },
      answerStep: '1',
    },
    { from: 'tbsp', to: 'ml', through: 'fl-oz', amounts: ['2', '14', '1'], answerStep: '1' },
    { from: 'ml', to: 'tbsp', through: 'fl-oz', amounts: ['40', '250', '5'], answerStep: '0.1' },
    {
      from: 'ml',
      to: 'pt',
      through: 'fl-oz',
      amounts: ['250', '2500', '50'],
      mixUp: { of: 'to', as: 'cup' },
      answerStep: '0.1',
    },
    { from: 'l', to: 'fl-oz', through: 'ml', amounts: ['0.5', '4', '0.25'], answerStep: '1' },
    { from: 'gal', to: 'l', amounts: ['1.5', '15', '0.5'], mixUp: { of: 'from', as: 'qt' }, answerStep: '0.1' },
  ],
};
