// @ts-check
import { runCommand } from './setup/command-line.mjs';
import { runApp } from './setup/run-app.mjs';

await runCommand((shutdown) => runApp('start', shutdown));
