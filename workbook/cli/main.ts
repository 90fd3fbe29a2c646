import { realpathSync, writeSync } from 'node:fs';
import path from 'node:path';
import { text } from 'node:stream/consumers';
import { runCommand } from './runCommand';
import { EXIT } from './usage';

/** Everything goes out before the process ends, also into a slow pipe. */
function write(descriptor: number, words: string): void {
  const bytes = Buffer.from(words, 'utf8');
  for (let done = 0; done < bytes.length;) {
    try {
      done += writeSync(descriptor, bytes, done);
    } catch (thrown) {
      const { code } = thrown as NodeJS.ErrnoException;
      if (code === 'EAGAIN') continue;
      // Whoever read the output has seen enough.
      if (code === 'EPIPE') process.exit(EXIT.fine);
      throw thrown;
    }
  }
}

const here = path.dirname(realpathSync(process.argv[1] ?? ''));

runCommand(process.argv.slice(2), {
  out: (words) => write(1, words),
  err: (words) => write(2, words),
  input: () => text(process.stdin),
  terminal: process.stdout.isTTY,
  bundlePath: path.join(here, 'functions.js'),
}).then(
  (exit) => process.exit(exit),
  (thrown: unknown) => {
    write(
      2,
      `latentry: internal error: ${thrown instanceof Error ? (thrown.stack ?? thrown.message) : String(thrown)}\n`,
    );
    process.exit(EXIT.defect);
  },
);
