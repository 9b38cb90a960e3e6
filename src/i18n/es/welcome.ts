export const es = {
  documentTitle: 'Preparación para el examen de aplicador de pesticidas',
  headline: 'Sepa la cuenta antes de llenar el tanque.',
  lead: 'Lecciones y problemas nuevos para el examen de aplicador de pesticidas, para cuadrillas de jardines y áreas verdes. Cuando una respuesta está mal, Tankmark le dice cuál fue el error.',
  create: 'Crear una cuenta',
  toToday: 'Ir a Hoy',
  workNow: 'Resolver un problema ahora',
  sampleTitle: 'Haga uno ahora',
  sampleHelp: 'Sin cuenta. Nada de lo que escriba aquí se guarda.',
  another: 'Otro problema',
  what: 'Lo que hace aquí',
  learn: 'Apréndalo',
  learnText:
    'Lecciones cortas en palabras sencillas, en su teléfono: medir el terreno, dosis, medidas y unidades, boquillas, calibración.',
  work: 'Practíquelo',
  workText:
    'Problemas con números nuevos cada vez, dibujados a escala, con etiquetas de práctica. Las respuestas cuentan con su unidad.',
  know: 'Sepa dónde está',
  knowText:
    'Un nivel para cada tema, con su rango probable, según sus propias respuestas. Sus errores tienen nombre y se cuentan.',
  forWhom: 'Para quién',
  trainees: 'Quienes se preparan',
  traineesText: 'Usted toma el examen escrito y quiere que las cuentas le salgan solas. En inglés o en español.',
  alone: 'Quienes estudian solos',
  aloneText: 'Usted trabaja a su paso: lecciones, ejercicios y la solución paso a paso de cada problema.',
  families: 'Quienes enseñan',
  familiesText: 'Usted puede hacer cada problema y ver los errores que cometen las personas.',
  standing:
    'Tankmark prepara para exámenes; no da licencias. Las etiquetas y los números de práctica son inventados. En el trabajo, la etiqueta del envase es la ley, y las reglas de su estado pueden ser más estrictas: pregunte a la agencia estatal. En una emergencia llame al 911; centro de envenenamiento 1-800-222-1222.',
};
