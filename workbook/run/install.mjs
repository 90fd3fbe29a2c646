import { isInstalled, writeInstallStamp } from './installed.mjs';
import { withLock } from './lock.mjs';
import { npm } from './npm.mjs';
import { root } from './root.mjs';
import { lockFolder, note } from './note.mjs';

/** Installs the packages of the lock file, development ones too, unless they are there. */
export async function install() {
  if (isInstalled(root)) return;
  await withLock(
    lockFolder,
    'install',
    async () => {
      if (isInstalled(root)) return;
      note('installing packages (once)');
      const status = await npm(['ci', '--include=dev', '--no-audit', '--no-fund']);
      if (status !== 0) throw new Error(`npm ci ended with ${status}`);
      writeInstallStamp(root);
    },
    (holder) => note(`waiting for process ${holder}, which installs packages`),
  );
}
