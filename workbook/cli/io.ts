/** What the command reads from and writes to. */
export interface Io {
  /** Standard output: results only. */
  out(text: string): void;
  /** Standard error: everything else. */
  err(text: string): void;
  /** All of standard input. */
  input(): Promise<string>;
  /** Whether a person reads the output. */
  readonly terminal: boolean;
  /** Path of the functions bundle. */
  readonly bundlePath: string;
}
