import { projectRoot } from '../server/project-root.ts';
import {
  documentation,
  duplication,
  escapes,
  fileLengths,
  functionLengths,
  importCycles,
  type Measure,
} from './structure/measures.ts';
import { sourceFiles } from './structure/source-files.ts';

// The measures that keep the code base in hand: each figure beside its bar; exit 1 when one is over.

const files = sourceFiles(projectRoot);
const measures: Measure[] = [
  ...fileLengths(files),
  ...functionLengths(files),
  importCycles(files),
  escapes(files),
  documentation(files),
  duplication(files),
];
for (const { name, figure, bar, places } of measures) {
  console.log(`${figure <= bar ? 'ok    ' : 'OVER  '} ${name}: ${figure} (bar ${bar})`);
  if (figure > bar) for (const place of places.slice(0, 15)) console.log(`         ${place}`);
}
if (measures.some(({ figure, bar }) => figure > bar)) process.exitCode = 1;
