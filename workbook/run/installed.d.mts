export function installStamp(folder: string): string;
export function isInstalled(folder: string): boolean;
export function writeInstallStamp(folder: string): void;
