/** The message of what was thrown; of a failed file access, what failed in plain words. */
export function wordsOf(thrown: unknown): string {
  if (!(thrown instanceof Error)) return String(thrown);
  switch ((thrown as NodeJS.ErrnoException).code) {
    case 'ENOENT':
      return 'no such file or folder';
    case 'EEXIST':
      return 'the file is there already; --force writes over it';
    case 'EACCES':
    case 'EPERM':
      return 'no permission';
    case 'EISDIR':
      return 'this is a folder';
    default:
      return thrown.message;
  }
}
