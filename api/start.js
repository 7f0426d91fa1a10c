// npm start: installs and builds what is missing or old, then serves bench and API. Takes --port and --host.
import { build, install } from './setup.js';

install();
build();
process.argv.splice(2, 0, 'serve');
await import('./copewright.js');
