export const es = {
  worked: 'Ejemplo resuelto',
  tank: 'Junto al tanque',
  caution: 'Cuidado',
  describe: 'Describir el dibujo',
};
