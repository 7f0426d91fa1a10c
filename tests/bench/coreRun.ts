import { standards } from '../../core/standards/index.ts';
import { coreBench } from './coreBench.ts';

// Run in a process of its own: the figures of all standards, one after the other, a line each.
for (const standard of Object.values(standards)) process.stdout.write(`${JSON.stringify(coreBench(standard))}\n`);
