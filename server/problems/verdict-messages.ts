import { formatQuantity, unitWord } from '../../shared/quantity/format.ts';
import type { ParseProblem } from '../../shared/quantity/parse.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import { kindOf, type Kind, type UnitKey } from '../../shared/quantity/units.ts';
import type { Text } from '../../shared/vocabulary.ts';
import type { CountPart, NumberPart } from './family.ts';

/** What the trainee reads: the first sentence names the mistake, the rest helps with these numbers. */
export interface Message {
  readonly headline: Text;
  readonly detail: Text;
}

const nothing: Text = { en: '', es: '' };

/** Splits a slip's message after its first sentence: the headline names the slip, the rest is the detail. */
export function asMessage(text: Text): Message {
  const cut = (whole: string): [string, string] => {
    const end = /[.?!](?=\s+[A-Z¿0-9ÁÉÍÓÚÑ])/.exec(whole);
    if (!end) return [whole.trim(), ''];
    return [whole.slice(0, end.index + 1).trim(), whole.slice(end.index + 1).trim()];
  };
  const en = cut(text.en);
  const es = cut(text.es);
  return { headline: { en: en[0], es: es[0] }, detail: { en: en[1], es: es[1] } };
}

/** For a right answer of any form. */
export const rightMessage: Message = { headline: { en: 'Right.', es: 'Correcto.' }, detail: nothing };

/** Right to the stated rounding, with the answer as one would measure it. */
export function rightNumber(part: NumberPart | CountPart, answer: Text): Message {
  if (part.kind === 'count') return rightMessage;
  return { headline: rightMessage.headline, detail: { en: `${answer.en}.`, es: `${answer.es}.` } };
}

/** Right for the person's own earlier answer. */
export function carriedMessage(own: Text, exact: Text): Message {
  return {
    headline: {
      en: 'Right for what you found before, so it earns its mark.',
      es: 'Correcto para lo que usted halló antes, así que cuenta.',
    },
    detail: {
      en: `Your own earlier answer gives ${own.en}. With the right earlier answer it is ${exact.en}.`,
      es: `Su respuesta anterior da ${own.es}. Con la respuesta anterior correcta es ${exact.es}.`,
    },
  };
}

const kindWords: Record<Kind, Text> = {
  length: { en: 'a length', es: 'una longitud' },
  area: { en: 'an area', es: 'un área' },
  volume: { en: 'a volume', es: 'un volumen' },
  weight: { en: 'a weight', es: 'un peso' },
  flow: { en: 'a flow', es: 'un caudal' },
  speed: { en: 'a speed', es: 'una velocidad' },
  pressure: { en: 'a pressure', es: 'una presión' },
  'volume-per-area': { en: 'a volume for an area', es: 'un volumen por área' },
  'weight-per-area': { en: 'a weight for an area', es: 'un peso por área' },
  'volume-per-volume': { en: 'a volume in a volume', es: 'un volumen en otro volumen' },
  'weight-per-volume': { en: 'a weight in a volume', es: 'un peso en un volumen' },
  percent: { en: 'a percent', es: 'un porcentaje' },
  parts: { en: 'parts per million', es: 'partes por millón' },
  temperature: { en: 'a temperature', es: 'una temperatura' },
  time: { en: 'a time', es: 'un tiempo' },
  money: { en: 'an amount of money', es: 'una cantidad de dinero' },
  'money-per-area': { en: 'a cost for an area', es: 'un costo por área' },
  'area-per-time': { en: 'an area for a time', es: 'un área por tiempo' },
  angle: { en: 'an angle', es: 'un ángulo' },
  count: { en: 'a plain number', es: 'un número sin unidad' },
};

/** The entry's unit measures another kind of thing: ounces by weight for fluid ounces. */
export function unitKindMessage(wrote: UnitKey, asked: UnitKey, sameNumber: boolean): Message {
  const wroteKind = kindWords[kindOf(wrote)];
  const askedKind = kindWords[kindOf(asked)];
  const unit = {
    en: unitWord(asked, { locale: 'en' }),
    es: unitWord(asked, { locale: 'es' }),
  };
  const number: Text = sameNumber
    ? { en: 'Your number fits, the unit does not.', es: 'Su número sirve, la unidad no.' }
    : nothing;
  const mix =
    kindOf(wrote) === 'weight' && kindOf(asked) === 'volume'
      ? {
          en: ' An ounce on a scale is not a fluid ounce in a measuring cup.',
          es: ' Una onza de balanza no es una onza líquida.',
        }
      : nothing;
  return {
    headline: {
      en: `You gave ${wroteKind.en}; the question asks for ${askedKind.en}.`,
      es: `Usted dio ${wroteKind.es}; se pide ${askedKind.es}.`,
    },
    detail: {
      en: `${number.en} Answer in ${unit.en || 'a plain number'}.${mix.en}`.trim(),
      es: `${number.es} Responda en ${unit.es || 'un número sin unidad'}.${mix.es}`.trim(),
    },
  };
}

/** The number fits another unit of the same kind. */
export function unitNameMessage(wrote: UnitKey, fits: UnitKey): Message {
  return {
    headline: { en: 'That number belongs to another unit.', es: 'Ese número es de otra unidad.' },
    detail: {
      en: `It would fit ${unitWord(fits, { locale: 'en' })}, but you wrote ${unitWord(wrote, { locale: 'en' })}. Write the unit you worked in, or change the number.`,
      es: `Serviría en ${unitWord(fits, { locale: 'es' })}, pero usted escribió ${unitWord(wrote, { locale: 'es' })}. Escriba la unidad con que trabajó o cambie el número.`,
    },
  };
}

/** Right digits, wrong power of ten. */
export function decimalPlaceMessage(tooLarge: boolean): Message {
  return {
    headline: {
      en: 'The digits are right; the decimal point is not.',
      es: 'Las cifras están bien; el punto decimal no.',
    },
    detail: tooLarge
      ? {
          en: 'Your answer is ten times too large, or more. Estimate first: what size must it be?',
          es: 'Su respuesta es diez veces mayor, o más. Estime primero: ¿de qué tamaño debe ser?',
        }
      : {
          en: 'Your answer is ten times too small, or more. Estimate first: what size must it be?',
          es: 'Su respuesta es diez veces menor, o más. Estime primero: ¿de qué tamaño debe ser?',
        },
  };
}

/** Right before rounding, wrong after. */
export function roundingMessage(part: NumberPart): Message {
  const step = quantity(part.step, part.answer.unit);
  return {
    headline: {
      en: 'Your working looks right; the rounding is not.',
      es: 'El cálculo parece correcto; el redondeo no.',
    },
    detail: {
      en: `Round once, at the end, to the nearest ${formatQuantity(step, { locale: 'en' })}.`,
      es: `Redondee una sola vez, al final, a ${formatQuantity(step, { locale: 'es' })}.`,
    },
  };
}

/** None of the known slips. */
export const unrecognisedMessage: Message = {
  headline: { en: 'This is none of the usual slips.', es: 'No es ninguno de los errores comunes.' },
  detail: {
    en: 'Check each number you took from the problem, or take a hint.',
    es: 'Revise cada número que tomó del problema, o pida una pista.',
  },
};

/** Zero or less, where only more can be right. */
export const negativeMessage: Message = {
  headline: { en: 'The answer cannot be zero or less.', es: 'La respuesta no puede ser cero ni menos.' },
  detail: { en: 'Look at which number you took away from which.', es: 'Mire qué número le restó a cuál.' },
};

/** A part of a thing, where whole things are counted. */
export const wholeOnlyMessage: Message = {
  headline: { en: 'These are whole things.', es: 'Aquí se cuentan cosas enteras.' },
  detail: { en: 'Give a whole number.', es: 'Dé un número entero.' },
};

/** A part closed without an answer. */
export const blankMessage: Message = {
  headline: { en: 'Left open.', es: 'Sin responder.' },
  detail: {
    en: 'The worked solution was shown before a right answer was given.',
    es: 'Se mostró la solución antes de dar una respuesta correcta.',
  },
};

/** The first rule an order breaks, in the words of the steps. */
export function orderMessage(first: Text, then: Text): Message {
  return {
    headline: { en: 'Some steps are out of order.', es: 'Algunos pasos están fuera de orden.' },
    detail: {
      en: `This one comes first: “${first.en}” After it: “${then.en}”`,
      es: `Primero va este: “${first.es}” Después: “${then.es}”`,
    },
  };
}

/** Why an entry could not be read, and what would be understood. */
export const unreadableMessages: Record<ParseProblem | 'no-such-option' | 'not-these-steps' | 'wrong-form', Text> = {
  empty: { en: 'Enter a number first.', es: 'Escriba primero un número.' },
  'no-number': {
    en: 'There is no number in this. Write one like 2.4 or 2 1/2.',
    es: 'Aquí no hay un número. Escriba uno como 2.4 o 2 1/2.',
  },
  'two-numbers': {
    en: 'There are two numbers in this. Write one, like 2.4 or 2 1/2.',
    es: 'Aquí hay dos números. Escriba uno, como 2.4 o 2 1/2.',
  },
  'unknown-unit': {
    en: 'This unit is not known here. Choose one from the list.',
    es: 'Esta unidad no se conoce aquí. Elija una de la lista.',
  },
  'zero-denominator': { en: 'A fraction cannot have 0 below the line.', es: 'Una fracción no puede tener 0 abajo.' },
  'too-long': {
    en: 'This is too long. Write one number and its unit.',
    es: 'Es demasiado largo. Escriba un número y su unidad.',
  },
  'mixed-kinds': { en: 'The units in this do not go together.', es: 'Las unidades no van juntas.' },
  'ambiguous-comma': {
    en: 'The comma can be read two ways. Write 1250 or 1.25.',
    es: 'La coma se puede leer de dos modos. Escriba 1250 o 1.25.',
  },
  'not-a-number': {
    en: 'This cannot be read as a number. Write one like 2.4 or 2 1/2.',
    es: 'No se puede leer como número. Escriba uno como 2.4 o 2 1/2.',
  },
  'no-such-option': { en: 'Choose one of the answers shown.', es: 'Elija una de las respuestas.' },
  'not-these-steps': {
    en: 'Put every step shown in order, each once.',
    es: 'Ordene todos los pasos, cada uno una vez.',
  },
  'wrong-form': {
    en: 'This question takes another form of answer.',
    es: 'Esta pregunta pide otra forma de respuesta.',
  },
};
/** Codes of what could not be read. */
export type UnreadableCode = keyof typeof unreadableMessages;
