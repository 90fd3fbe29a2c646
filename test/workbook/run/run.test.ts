import { spawn } from 'node:child_process';
import { mkdir, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, describe, expect, it } from 'vitest';
import { inputsHash } from '../../../workbook/run/inputsHash.mjs';
import { installStamp, isInstalled } from '../../../workbook/run/installed.mjs';
import { listen } from '../../../workbook/run/listen.mjs';
import { withLock } from '../../../workbook/run/lock.mjs';
import { openerOf } from '../../../workbook/run/openBrowser.mjs';
import { startOptions } from '../../../workbook/run/start.mjs';

const temporary = () => mkdtemp(path.join(tmpdir(), 'latentry-run-'));

describe('installed', () => {
  const lock = {
    packages: {
      '': { name: 'project' },
      'node_modules/a': { version: '1.0.0' },
      'node_modules/tool': { version: '2.0.0', dev: true },
      'node_modules/other-machine': { version: '1.0.0', optional: true },
    },
  };
  const folderWith = async (present: Record<string, { version: string }> | null) => {
    const folder = await temporary();
    await writeFile(path.join(folder, 'package-lock.json'), JSON.stringify(lock));
    if (present !== null) {
      await mkdir(path.join(folder, 'node_modules'));
      await writeFile(path.join(folder, 'node_modules/.package-lock.json'), JSON.stringify({ packages: present }));
    }
    return folder;
  };

  it('is false in a fresh clone, and where development packages were left out or differ', async () => {
    expect(isInstalled(await folderWith(null))).toBe(false);
    expect(isInstalled(await folderWith({ 'node_modules/a': { version: '1.0.0' } }))).toBe(false);
    expect(
      isInstalled(
        await folderWith({ 'node_modules/a': { version: '1.0.0' }, 'node_modules/tool': { version: '1.9.0' } }),
      ),
    ).toBe(false);
  });

  it('believes what npm itself recorded, leaves a stamp, and no longer once the lock file changes', async () => {
    const folder = await folderWith({
      'node_modules/a': { version: '1.0.0' },
      'node_modules/tool': { version: '2.0.0' },
    });
    expect(isInstalled(folder)).toBe(true);
    expect(await readFile(path.join(folder, 'node_modules/.latentry-stamp'), 'utf8')).toBe(installStamp(folder));
    await writeFile(path.join(folder, 'package-lock.json'), JSON.stringify({ ...lock, version: '2' }));
    expect(isInstalled(folder)).toBe(false);
  });
});

describe('inputsHash', () => {
  it('changes with a byte, a name or a new file of the sources, and with nothing else', async () => {
    const folder = await temporary();
    await mkdir(path.join(folder, 'core/water'), { recursive: true });
    await writeFile(path.join(folder, 'core/water/a.ts'), '1');
    const first = inputsHash(folder);
    await mkdir(path.join(folder, 'test'));
    await writeFile(path.join(folder, 'test/a.test.ts'), '1');
    expect(inputsHash(folder)).toBe(first);
    await writeFile(path.join(folder, 'core/water/a.ts'), '2');
    const second = inputsHash(folder);
    await writeFile(path.join(folder, 'core/water/b.ts'), '2');
    const third = inputsHash(folder);
    await rm(path.join(folder, 'core/water/a.ts'));
    expect(new Set([first, second, third, inputsHash(folder)]).size).toBe(4);
  });
});

describe('withLock', () => {
  it('lets one work at a time, and lets go after an error', async () => {
    const folder = await temporary();
    const log: string[] = [];
    const worker = (name: string) =>
      withLock(folder, 'build', async () => {
        log.push(`${name} in`);
        await new Promise((resolve) => setTimeout(resolve, 20));
        log.push(`${name} out`);
      });
    await Promise.all([worker('a'), worker('b'), worker('c')]);
    for (let i = 0; i < log.length; i += 2) expect(log[i + 1]).toBe(log[i]?.replace('in', 'out'));
    expect(log).toHaveLength(6);
    await expect(withLock(folder, 'build', () => Promise.reject(new Error('broken')))).rejects.toThrow('broken');
    expect(await withLock(folder, 'build', () => Promise.resolve('free again'))).toBe('free again');
  });

  it('takes over the lock of a process that is gone, and waits for one that lives', async () => {
    const folder = await temporary();
    const gone = spawn(process.execPath, ['-e', '']);
    await new Promise((resolve) => gone.on('close', resolve));
    await writeFile(path.join(folder, 'install.lock'), String(gone.pid));
    expect(await withLock(folder, 'install', () => Promise.resolve('taken over'))).toBe('taken over');

    const alive = spawn(process.execPath, ['-e', 'process.stdin.resume()']);
    await writeFile(path.join(folder, 'install.lock'), String(alive.pid));
    const waited: number[] = [];
    const later = withLock(
      folder,
      'install',
      () => Promise.resolve(waited.length),
      (holder) => {
        waited.push(holder);
        alive.stdin.end();
      },
    );
    expect(await later).toBe(1);
    expect(waited).toEqual([alive.pid]);
  });
});

describe('start', () => {
  const servers: Server[] = [];
  afterEach(() => {
    for (const server of servers.splice(0)) server.close();
  });
  const free = () => {
    const server = createServer();
    servers.push(server);
    return server;
  };

  it('takes another port where the one it wants is busy, on this computer only', async () => {
    const port = await listen(free(), 0);
    const server = free();
    const next = await listen(server, port);
    expect(next).toBeGreaterThan(port);
    expect(server.address()).toMatchObject({ address: '127.0.0.1', port: next });
  });

  it('reads its options and says what is wrong with them', () => {
    expect(startOptions([])).toEqual({ port: 8437, open: true });
    expect(startOptions(['--port', '9000', '--no-open'])).toEqual({ port: 9000, open: false });
    expect(startOptions(['--port', '99999'])).toBe('--port: allowed 0 to 65535; received 99999');
    expect(startOptions(['--prot', '1'])).toMatch(/^start: Unknown option '--prot'/);
  });

  it('opens a browser only where there is a desktop', () => {
    expect(openerOf('linux', {})).toBeNull();
    expect(openerOf('linux', { DISPLAY: ':0' })).toEqual(['xdg-open']);
    expect(openerOf('darwin', {})).toEqual(['open']);
  });
});
