export const es = {
  right: 'Correcto',
  carried: 'Gana su punto',
  slip: 'Un error conocido',
  notYet: 'Todavía no',
  blank: 'Sin responder',
  readAs: 'Se leyó como {read}.',
};
