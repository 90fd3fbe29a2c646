import { parseArgs, type ParseArgsConfig } from 'node:util';
import { Usage } from './usage';

/** Reads the arguments of one command; a slip becomes a `Usage` with the command's own help. */
export function readOptions<T extends NonNullable<ParseArgsConfig['options']>>(
  args: readonly string[],
  options: T,
  help: string,
) {
  try {
    return parseArgs({ args: [...args], options, allowPositionals: true, strict: true });
  } catch (thrown) {
    const words = thrown instanceof Error ? thrown.message : String(thrown);
    throw new Usage(
      words.replace(/\. To specify a positional argument.*$/s, '; a formula that starts with - needs its ='),
      help,
    );
  }
}
