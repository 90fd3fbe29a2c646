export function withLock<T>(
  folder: string,
  name: string,
  work: () => Promise<T>,
  onWait?: (holder: number) => void,
): Promise<T>;
