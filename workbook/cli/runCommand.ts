import { EDITION } from '../../functions/edge/editionText';
import { nearest } from '../../core/nearest';
import { calc } from './calc';
import { GENERAL_HELP } from './help';
import type { Io } from './io';
import { newBook } from './newBook';
import { EXIT, Usage, type Exit } from './usage';

const COMMANDS: Readonly<Record<string, (args: readonly string[], io: Io) => Promise<Exit>>> = { calc, new: newBook };

/**
 * Runs the command line.
 * @param args What follows the program's name.
 * @returns The exit code; nothing is printed to standard output where it is `EXIT.usage`.
 */
export async function runCommand(args: readonly string[], io: Io): Promise<Exit> {
  try {
    const [name, ...rest] = args;
    if (name === '--help' || name === '-h' || name === 'help') {
      io.out(GENERAL_HELP);
      return EXIT.fine;
    }
    if (name === '--version' || name === '-v') {
      io.out(`${EDITION}\n`);
      return EXIT.fine;
    }
    if (name === undefined) throw new Usage('no command given');
    const command = Object.hasOwn(COMMANDS, name) ? COMMANDS[name] : undefined;
    if (command === undefined) {
      const near = nearest(name, Object.keys(COMMANDS));
      throw new Usage(`no command ${name}; allowed calc, new${near === undefined ? '' : `; nearest: ${near}`}`);
    }
    return await command(rest, io);
  } catch (thrown) {
    if (!(thrown instanceof Usage)) throw thrown;
    io.err(`latentry: ${thrown.message}\nMore: ${thrown.help}\n`);
    return EXIT.usage;
  }
}
