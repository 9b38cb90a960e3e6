export const es = {
  title: 'Buzón',
  intro: 'Todos los mensajes que esta demostración ha enviado, a cualquiera. En el uso real no existe esta página.',
  empty: 'Todavía no se envió nada. Cree una cuenta y su mensaje aparece aquí.',
  list: 'Mensajes, el más nuevo primero',
  to: 'Para {to}',
  from: 'De {from}',
  choose: 'Elija un mensaje para leerlo.',
  back: 'Todos los mensajes',
};
