import { both } from '../both.ts';
import type { PatternRule } from './pattern-rule.ts';

/**
 * Second tier: what is seen after spraying and the pattern that must have been fitted. Source: as for the jobs; the signs
 * follow from the marks that the patterns leave.
 */
export const patternSigns: readonly PatternRule[] = [
  {
    key: 'striped-double',
    right: 'even-fan',
    why: both(
      "An even flat fan's edges carry as much as its middle, so each overlap gets a double dose.",
      'Las bordes llevan del abanico uniforme tanto como el centro, así que cada traslape recibe doble dosis.',
    ),
    told: [
      both(
        'After a boom treatment, the turf is yellow in stripes exactly where two nozzles overlap. Between the stripes it looks right.',
        'Después de tratar con aguilón, el césped está amarillo en franjas justo donde se traslapan dos boquillas. Entre las franjas se ve bien.',
      ),
      both(
        'A catch test under the boom shows twice the spray wherever two nozzles overlap, and the right amount elsewhere.',
        'Una prueba de captación bajo el aguilón muestra el doble donde se traslapan dos boquillas, y lo correcto en lo demás.',
      ),
    ],
    wrong: [
      {
        pattern: 'flat-fan',
        slip: 'mistook-flat-fan',
        reason: both(
          'A flat fan tapers at the edges, so overlaps add up to the same as the middle.',
          'El abanico plano se adelgaza en los bordes, así que los traslapes suman lo mismo que el centro.',
        ),
      },
      {
        pattern: 'hollow-cone',
        slip: 'mistook-hollow-cone',
        reason: both(
          'A hollow cone would show rings and drift, not clean double stripes.',
          'El cono hueco mostraría anillos y deriva, no franjas dobles bien marcadas.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'mistook-stream',
        reason: both(
          'A solid stream would leave dry ground between narrow wet lines.',
          'El chorro sólido dejaría suelo seco entre líneas mojadas angostas.',
        ),
      },
    ],
  },
  {
    key: 'weak-edges',
    right: 'flat-fan',
    why: both(
      'A flat fan thins out toward its edges, and with no overlap the edges of the band go short.',
      'El abanico plano se adelgaza hacia los bordes, y sin traslape a las orillas de la banda les falta.',
    ),
    told: [
      both(
        'One nozzle sprays a band along a fence. The weeds die in the middle of the band and live along both edges.',
        'Una boquilla rocía una banda junto a la cerca. Las malezas mueren en el centro de la banda y viven en las dos orillas.',
      ),
      both(
        'Paper laid across a single band shows plenty of spray in the middle and fading to both sides.',
        'Un papel puesto a través de una sola banda muestra mucho rociado en el centro y cada vez menos hacia los lados.',
      ),
    ],
    wrong: [
      {
        pattern: 'even-fan',
        slip: 'mistook-even-fan',
        reason: both(
          'An even flat fan gives the same amount from edge to edge of the band.',
          'El abanico uniforme da la misma cantidad de orilla a orilla de la banda.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'mistook-stream',
        reason: both(
          'A solid stream would wet one narrow line in the band.',
          'El chorro sólido mojaría una línea angosta dentro de la banda.',
        ),
      },
      {
        pattern: 'hollow-cone',
        slip: 'mistook-hollow-cone',
        reason: both(
          'A hollow cone leaves a ring: less in the middle, more toward the rim.',
          'El cono hueco deja un anillo: menos en el centro, más hacia el borde.',
        ),
      },
    ],
  },
  {
    key: 'dry-lines',
    right: 'stream',
    why: both(
      'Each jet wets one narrow line and nothing beside it.',
      'Cada chorro moja una línea angosta y nada a los lados.',
    ),
    told: [
      both(
        'After treating a lawn, thin lines of dead weeds run along the path of the nozzles. The weeds between the lines are untouched.',
        'Después de tratar un césped, hay líneas delgadas de maleza muerta por donde pasaron las boquillas. La maleza entre las líneas sigue intacta.',
      ),
      both(
        'Dye in the tank shows wet lines an inch wide on the paving, with dry ground between them.',
        'Con tinte en el tanque se ven líneas mojadas de una pulgada en el pavimento y suelo seco entre ellas.',
      ),
    ],
    wrong: [
      {
        pattern: 'flat-fan',
        slip: 'mistook-flat-fan',
        reason: both(
          'A flat fan spreads the spray across its whole width, with no gaps between overlapped nozzles.',
          'El abanico plano reparte el rociado en todo su ancho, sin huecos entre boquillas traslapadas.',
        ),
      },
      {
        pattern: 'even-fan',
        slip: 'mistook-even-fan',
        reason: both(
          'An even flat fan covers a full band, not a line an inch wide.',
          'El abanico uniforme cubre una banda completa, no una línea de una pulgada.',
        ),
      },
      {
        pattern: 'flood',
        slip: 'mistook-flood',
        reason: both(
          'A flooding fan lays a wide sheet, the opposite of narrow lines.',
          'El abanico inundador tiende una cortina ancha, lo contrario de líneas angostas.',
        ),
      },
    ],
  },
  {
    key: 'rings-and-mist',
    right: 'hollow-cone',
    why: both(
      'A hollow cone makes a ring of small drops, and small drops drift most.',
      'El cono hueco hace un anillo de gotas pequeñas, y las gotas pequeñas son las que más se van.',
    ),
    told: [
      both(
        'Over open turf a fine mist floats toward the flower beds. On paper held still below, the spray leaves a ring.',
        'Sobre césped abierto, una neblina fina flota hacia los arriates. En un papel quieto debajo, el rociado deja un anillo.',
      ),
      both(
        'Held over dry paving for a moment, the nozzle leaves a wet ring, dry inside. In the air its drops hang and move sideways.',
        'Sobre pavimento seco, la boquilla deja por un momento un anillo mojado, seco por dentro. En el aire las gotas quedan suspendidas y se van de lado.',
      ),
    ],
    wrong: [
      {
        pattern: 'flat-fan',
        slip: 'mistook-flat-fan',
        reason: both('A flat fan leaves a line across, not a ring.', 'El abanico plano deja una línea, no un anillo.'),
      },
      {
        pattern: 'flood',
        slip: 'mistook-flood',
        reason: both(
          'A flooding fan lays large drops in a wide sheet; they fall fast.',
          'El abanico inundador deja gotas grandes en una cortina ancha; caen rápido.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'mistook-stream',
        reason: both(
          'A solid stream stays together in one jet and leaves a spot.',
          'El chorro sólido se mantiene en un solo chorro y deja un punto.',
        ),
      },
    ],
  },
  {
    key: 'wide-and-coarse',
    right: 'flood',
    why: both(
      'At low pressure it lays a very wide sheet of large drops.',
      'A baja presión tiende una cortina muy ancha de gotas grandes.',
    ),
    told: [
      both(
        'One nozzle at 15 pounds per square inch (psi) wets a strip several feet wide from low down, in large drops that splash.',
        'Una boquilla a 15 libras por pulgada cuadrada (psi) moja desde poca altura una franja de varios pies de ancho, con gotas grandes que salpican.',
      ),
      both(
        'The nozzles are 40 inches apart and run at 20 pounds per square inch (psi), yet the ground is wet all over with large drops.',
        'Las boquillas están a 40 pulgadas y trabajan a 20 libras por pulgada cuadrada (psi), pero el suelo queda mojado por todas partes con gotas grandes.',
      ),
    ],
    wrong: [
      {
        pattern: 'even-fan',
        slip: 'mistook-even-fan',
        reason: both(
          'An even flat fan is made for a single narrow band, and leaves gaps when spaced this wide.',
          'El abanico uniforme está hecho para una sola banda angosta y con esa separación deja huecos.',
        ),
      },
      {
        pattern: 'hollow-cone',
        slip: 'mistook-hollow-cone',
        reason: both(
          'A hollow cone breaks the spray into small drops in a ring.',
          'El cono hueco rompe el rociado en gotas pequeñas en forma de anillo.',
        ),
      },
      {
        pattern: 'stream',
        slip: 'mistook-stream',
        reason: both(
          'A solid stream wets a narrow line, not a wide strip.',
          'El chorro sólido moja una línea angosta, no una franja ancha.',
        ),
      },
    ],
  },
];
