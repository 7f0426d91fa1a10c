import { readFileSync } from 'node:fs';
import { sheetPdf } from '../../../core/sheet/sheet.ts';
import { examined } from './ends.ts';

// Run in a process of its own: the sheet of the end on standard input, printed by a program that has printed nothing before.
process.stdout.write(await sheetPdf(examined(JSON.parse(readFileSync(0, 'utf8'))), { workings: 'all' }));
