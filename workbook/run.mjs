#!/usr/bin/env node
/** `node workbook/run.mjs COMMAND`: installs and builds what is missing, then acts. Node's own modules only. */
import { run } from './run/commands.mjs';

process.exitCode = await run(process.argv.slice(2));
