import { spawn } from 'node:child_process';

/** Opens an address in the person's browser where there is a person and a browser; never fails. */
export function openBrowser(
  url,
  { platform = process.platform, env = process.env, terminal = process.stdout.isTTY } = {},
) {
  const opener = openerOf(platform, env);
  if (!terminal || env.CI !== undefined || opener === null) return;
  const [command, ...args] = opener;
  const child = spawn(command, [...args, url], { stdio: 'ignore', detached: true });
  child.on('error', () => undefined);
  child.unref();
}

/** The command that opens an address; null without a desktop. */
export function openerOf(platform, env) {
  if (platform === 'darwin') return ['open'];
  if (platform === 'win32') return ['rundll32', 'url.dll,FileProtocolHandler'];
  return env.DISPLAY !== undefined || env.WAYLAND_DISPLAY !== undefined ? ['xdg-open'] : null;
}
