import type { MessageCatalogue } from './message-texts.ts';

export const es: MessageCatalogue = {
  greeting: (name) => `Hola, ${name}:`,
  ifNotButton: 'Si el botón no funciona, copie esta dirección en su navegador:',
  footer: 'Tankmark, preparación para el examen de aplicador de pesticidas.',
  kinds: {
    confirm: () => ({
      subject: 'Confirme su dirección de correo',
      lead: 'Alguien, seguramente usted, creó una cuenta de Tankmark con esta dirección. Confírmela para usar la cuenta.',
      action: 'Confirmar mi dirección',
      after: 'El enlace sirve durante 24 horas. Si no fue usted, no haga nada: la cuenta seguirá cerrada.',
    }),
    reset: () => ({
      subject: 'Elija una contraseña nueva',
      lead: 'Usted pidió una contraseña nueva para su cuenta de Tankmark.',
      action: 'Elegir una contraseña nueva',
      after: 'El enlace sirve una sola vez, durante una hora. Si no lo pidió, no haga nada: su contraseña sigue igual.',
    }),
    'address-old': ({ newAddress }) => ({
      subject: 'Cambio de su dirección de correo',
      lead: `Usted pidió cambiar la dirección de su cuenta de Tankmark a ${newAddress}. Permítalo aquí; después escribiremos a la dirección nueva.`,
      action: 'Permitir el cambio',
      after: 'El enlace sirve durante 24 horas. Si no lo pidió, no haga nada y cambie su contraseña.',
    }),
    'address-new': () => ({
      subject: 'Confirme su dirección nueva',
      lead: 'Esta dirección se dio como la nueva de una cuenta de Tankmark. Confírmela para terminar el cambio.',
      action: 'Confirmar mi dirección nueva',
      after: 'El enlace sirve durante 24 horas. Si no fue usted, no haga nada: nada cambia.',
    }),
    'already-here': () => ({
      subject: 'Usted ya tiene una cuenta',
      lead: 'Alguien, quizás usted, quiso crear una cuenta de Tankmark con esta dirección. Ya existe una, así que nada cambió. Inicie sesión, o elija una contraseña nueva si olvidó la suya.',
      action: 'Ir a iniciar sesión',
      after: 'Si no fue usted, no necesita hacer nada.',
    }),
  },
};
