import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import webpack from 'webpack';

/** Emits the licences of every package whose code is in the bundles. */
export class NoticePlugin {
  constructor(output) {
    this.output = output;
  }

  apply(compiler) {
    compiler.hooks.compilation.tap('NoticePlugin', (compilation) => {
      compilation.hooks.processAssets.tap(
        { name: 'NoticePlugin', stage: webpack.Compilation.PROCESS_ASSETS_STAGE_SUMMARIZE },
        () => {
          const folders = new Set();
          for (const module of compilation.modules) collect(module, folders);
          const notices = [...folders].map(noticeOf).sort();
          compilation.emitAsset(this.output, new webpack.sources.RawSource([...new Set(notices)].join('\n')));
        },
      );
    });
  }
}

function collect(module, folders) {
  for (const inner of module.modules ?? []) collect(inner, folders);
  const folder = packageFolder(module.resource ?? '');
  if (folder !== undefined) folders.add(folder);
}

function packageFolder(resource) {
  const mark = `${path.sep}node_modules${path.sep}`;
  const at = resource.lastIndexOf(mark);
  if (at < 0) return undefined;
  const parts = resource.slice(at + mark.length).split(path.sep);
  const name = parts[0]?.startsWith('@') ? parts.slice(0, 2) : parts.slice(0, 1);
  return path.join(resource.slice(0, at + mark.length), ...name);
}

function noticeOf(folder) {
  const manifest = JSON.parse(readFileSync(path.join(folder, 'package.json'), 'utf8'));
  const file = existsSync(folder) ? readdirSync(folder).find((name) => /^licen[cs]e/i.test(name)) : undefined;
  const text = file === undefined ? '' : readFileSync(path.join(folder, file), 'utf8').trim();
  const licence = typeof manifest.license === 'string' ? manifest.license : 'see its repository';
  return `${'='.repeat(78)}\n${manifest.name} ${manifest.version} — ${licence}\n\n${text}\n`;
}
