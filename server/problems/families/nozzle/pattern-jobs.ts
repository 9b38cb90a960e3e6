import { both } from '../both.ts';
import type { PatternRule } from './pattern-rule.ts';

/**
 * First tier: a job and the pattern for it. Source: MF3178, Kansas State University Extension (flat fan broadcast, even fan
 * for bands only); Sprayer Nozzles: Selection and Calibration (PAT-3), University of
 * Kentucky Cooperative Extension, 1996; nozzle slides, Montana State University (flood, cone, solid stream).
 */
export const patternJobs: readonly PatternRule[] = [
  {
    key: 'broadcast',
    right: 'flat-fan',
    why: both(
      'A flat fan tapers toward its edges, so passes that overlap add up to an even cover.',
      'El abanico plano se adelgaza hacia los bordes, así que las pasadas que se traslapan dan una cobertura pareja.',
    ),
    told: [
      both(
        'The boom of the ride-on sprayer treats a whole lawn for clover. Its nozzles overlap, and each pass overlaps the last.',
        'El aguilón del rociador montado trata todo un césped contra el trébol. Las boquillas se traslapan y cada pasada se traslapa con la anterior.',
      ),
      both(
        'An open stretch of grass gets a broadcast weed treatment from a boom. The spray of neighboring nozzles overlaps.',
        'Un tramo abierto de césped recibe un tratamiento general contra malezas con un aguilón. El rociado de boquillas vecinas se traslapa.',
      ),
      both(
        'A walk-behind boom sprays a lawn for broadleaf weeds from edge to edge, with overlap between nozzles.',
        'Un rociador de empuje con aguilón trata un césped contra malezas de hoja ancha de orilla a orilla, con traslape entre boquillas.',
      ),
    ],
    wrong: [
      {
        pattern: 'even-fan',
        slip: 'even-for-broadcast',
        reason: both(
          'An even flat fan gives as much at its edges as in the middle. Where two overlap, the grass gets a double dose.',
          'El abanico uniforme da lo mismo en los bordes que en el centro. Donde dos se traslapan, el césped recibe doble dosis.',
        ),
      },
      {
        pattern: 'hollow-cone',
        slip: 'cone-for-broadcast-weeds',
        reason: both(
          'A hollow cone makes many small drops in a ring. On open turf they drift and cover unevenly.',
          'El cono hueco hace muchas gotas pequeñas en un anillo. En césped abierto se van con el viento y cubren disparejo.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'stream-for-cover',
        reason: both(
          'A solid stream wets narrow lines. The weeds between them get nothing.',
          'El chorro sólido moja líneas angostas. Las malezas entre ellas no reciben nada.',
        ),
      },
    ],
  },
  {
    key: 'band',
    right: 'even-fan',
    why: both(
      'An even flat fan gives the same amount across its whole width, so one pass covers the band without overlap.',
      'El abanico uniforme da la misma cantidad en todo su ancho, así que una pasada cubre la banda sin traslape.',
    ),
    told: [
      both(
        'A strip 18 inches wide along a fence is sprayed in one pass, with one nozzle and no overlap.',
        'Una franja de 18 pulgadas a lo largo de una cerca se rocía en una pasada, con una boquilla y sin traslape.',
      ),
      both(
        'One nozzle sprays a 12-inch band along the curb. Nothing overlaps it, and the band must be even from edge to edge.',
        'Una boquilla rocía una banda de 12 pulgadas junto al bordillo. Nada se traslapa y la banda debe quedar pareja de orilla a orilla.',
      ),
      both(
        'In a row of young hedge plants, one nozzle lays a single band on the soil beside the row.',
        'En una hilera de setos jóvenes, una boquilla aplica una sola banda en el suelo junto a la hilera.',
      ),
    ],
    wrong: [
      {
        pattern: 'flat-fan',
        slip: 'fan-for-band',
        reason: both(
          'A flat fan thins out toward its edges. With no overlap the edges of the band get too little.',
          'El abanico plano se adelgaza hacia los bordes. Sin traslape, las orillas de la banda reciben muy poco.',
        ),
      },
      {
        pattern: 'flood',
        slip: 'flood-for-band',
        reason: both(
          'A flooding fan throws a very wide sheet that needs overlap. It does not hold a narrow band.',
          'El abanico inundador lanza una cortina muy ancha que necesita traslape. No mantiene una banda angosta.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'stream-for-cover',
        reason: both(
          'A solid stream wets one narrow line. Most of the band stays dry.',
          'El chorro sólido moja una línea angosta. La mayor parte de la banda queda seca.',
        ),
      },
    ],
  },
  {
    key: 'canopy',
    right: 'hollow-cone',
    why: both(
      "A hollow cone's small swirling drops come from many directions and get in among the leaves.",
      'Las gotas pequeñas del cono hueco giran, llegan de muchas direcciones y entran entre las hojas.',
    ),
    told: [
      both(
        'Mites sit on the inner leaves of a dense hedge. The spray has to get in among the leaves and under them.',
        'Hay ácaros en las hojas interiores de un seto tupido. El rociado debe entrar entre las hojas y por debajo.',
      ),
      both(
        'A thick shrub border has powdery mildew inside as well as outside. The fungicide must reach all the leaves.',
        'Un borde de arbustos tupidos tiene cenicilla por dentro y por fuera. El fungicida debe llegar a todas las hojas.',
      ),
      both(
        'Lace bugs feed on the undersides of leaves in full-grown shrubs. A directed spray must reach deep into the plants.',
        'Chinches de encaje comen en el envés de las hojas de arbustos grandes. Un rociado dirigido debe llegar bien adentro de las plantas.',
      ),
    ],
    wrong: [
      {
        pattern: 'flat-fan',
        slip: 'fan-for-canopy',
        reason: both(
          'A flat fan wets the side that faces you. The inner leaves stay dry.',
          'El abanico plano moja el lado que da hacia usted. Las hojas de adentro quedan secas.',
        ),
      },
      {
        pattern: 'even-fan',
        slip: 'fan-for-canopy',
        reason: both(
          'An even flat fan is made for bands on the ground. In a shrub it wets only the side that faces you.',
          'El abanico uniforme está hecho para bandas en el suelo. En un arbusto solo moja el lado que da hacia usted.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'stream-for-cover',
        reason: both(
          'A solid stream drives through one spot. Most leaves get no spray at all.',
          'El chorro sólido atraviesa un solo punto. La mayoría de las hojas no recibe nada.',
        ),
      },
      {
        pattern: 'flood',
        slip: 'flood-for-canopy',
        reason: both(
          "A flooding fan's large drops hit the outer leaves and run off.",
          'Las gotas grandes del abanico inundador dan en las hojas de afuera y escurren.',
        ),
      },
    ],
  },
  {
    key: 'reach',
    right: 'stream',
    why: both(
      'One jet holds together and carries to where you aim it.',
      'Un solo chorro se mantiene unido y llega adonde usted apunta.',
    ),
    told: [
      both(
        'A hand gun has to reach the top of a tall tree from the ground.',
        'Una pistola de mano debe llegar desde el suelo a la copa de un árbol alto.',
      ),
      both(
        'Ants go in and out of a crack at the foot of a wall. The spray goes into the crack, not on the wall.',
        'Las hormigas entran y salen por una grieta al pie de un muro. El rociado va en la grieta, no en el muro.',
      ),
      both(
        'A label allows treating narrow crevices between paving stones, and only there.',
        'Una etiqueta permite tratar las rendijas angostas entre las losas, y solo ahí.',
      ),
    ],
    wrong: [
      {
        pattern: 'flat-fan',
        slip: 'fan-for-aim',
        reason: both(
          'A flat fan spreads as it leaves the tip. Little of it arrives where it is aimed.',
          'El abanico plano se abre al salir de la punta. Poco llega adonde se apunta.',
        ),
      },
      {
        pattern: 'hollow-cone',
        slip: 'cone-for-aim',
        reason: both(
          'A hollow cone breaks up into small drops that float off. Little of it arrives where it is aimed.',
          'El cono hueco se rompe en gotas pequeñas que se las lleva el aire. Poco llega adonde se apunta.',
        ),
      },
      {
        pattern: 'flood',
        slip: 'flood-for-aim',
        reason: both(
          'A flooding fan lays a wide, low sheet. It neither reaches far nor fits a narrow place.',
          'El abanico inundador tiende una cortina ancha y baja. No llega lejos ni cabe en un lugar angosto.',
        ),
      },
    ],
  },
  {
    key: 'soil',
    right: 'flood',
    why: both(
      'At low pressure it lays large drops in a wide pattern, with full overlap between nozzles.',
      'A baja presión deja gotas grandes en un patrón ancho, con traslape completo entre boquillas.',
    ),
    told: [
      both(
        'A soil herbicide goes on bare ground. The boom runs at 20 pounds per square inch (psi) with nozzles 40 inches apart, and large drops are wanted.',
        'Un herbicida de suelo va en tierra desnuda. El aguilón trabaja a 20 libras por pulgada cuadrada (psi) con boquillas a 40 pulgadas, y se buscan gotas grandes.',
      ),
      both(
        'Liquid fertilizer is put on bare soil at 15 pounds per square inch (psi), with wide nozzle spacing and full overlap.',
        'Se aplica fertilizante líquido en suelo desnudo a 15 libras por pulgada cuadrada (psi), con boquillas muy separadas y traslape completo.',
      ),
      both(
        'A product for the soil, not for leaves, is sprayed at 20 pounds per square inch (psi) from a few nozzles set far apart. Drift must stay low.',
        'Un producto para el suelo, no para las hojas, se rocía a 20 libras por pulgada cuadrada (psi) con pocas boquillas muy separadas. Debe haber poca deriva.',
      ),
    ],
    wrong: [
      {
        pattern: 'hollow-cone',
        slip: 'cone-for-soil',
        reason: both(
          "A hollow cone's small drops are for getting in among leaves. Over bare ground they drift.",
          'Las gotas pequeñas del cono hueco son para entrar entre hojas. Sobre suelo desnudo se van con el viento.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'stream-for-cover',
        reason: both(
          'A solid stream wets narrow lines. The ground between them gets nothing.',
          'El chorro sólido moja líneas angostas. El suelo entre ellas no recibe nada.',
        ),
      },
      {
        pattern: 'even-fan',
        slip: 'even-for-broadcast',
        reason: both(
          'An even flat fan is for single bands. Spaced this far apart it leaves gaps, and overlapped it doubles the dose.',
          'El abanico uniforme es para bandas sueltas. Con esa separación deja huecos, y traslapado dobla la dosis.',
        ),
      },
    ],
  },
];
