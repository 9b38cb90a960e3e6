export const es = {
  'not-started': 'sin empezar',
  filling: 'llenando',
  'at-the-mark': 'en la marca',
  'top-up': 'rellenar',
};
