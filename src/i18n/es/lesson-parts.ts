export const es = {
  worked: 'Ejemplo resuelto',
  tank: 'Junto al tanque',
  caution: 'Tenga cuidado',
  describe: 'Describir el dibujo',
};
