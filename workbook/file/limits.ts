/** What a file may cost before it is refused. */
export interface FileLimits {
  readonly fileBytes: number;
  /** One part of the package, unpacked. */
  readonly partBytes: number;
  /** All parts of the package together, unpacked. */
  readonly totalBytes: number;
  /** Unpacked over packed, for parts of more than `ratioFromBytes`. Deflate itself ends near 1032. */
  readonly ratio: number;
  readonly ratioFromBytes: number;
  readonly parts: number;
  readonly cells: number;
  /** Formula text after shared formulas are written out for each cell. */
  readonly formulaCharacters: number;
}

const MIB = 1024 * 1024;

export const DEFAULT_LIMITS: FileLimits = {
  fileBytes: 200 * MIB,
  partBytes: 128 * MIB,
  totalBytes: 512 * MIB,
  ratio: 200,
  ratioFromBytes: 4 * MIB,
  parts: 10_000,
  cells: 2_000_000,
  formulaCharacters: 64 * MIB,
};
