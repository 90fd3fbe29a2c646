import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { NAMESPACE } from '../../workbook/grid/functionList';
import { nodesAt, xmlTree } from './xmlTree';

const root = path.resolve(import.meta.dirname, '../..');
const text = readFileSync(path.join(root, 'manifest/manifest.xml'), 'utf8');
const manifest = xmlTree(text);
const overrides = nodesAt(manifest, 'VersionOverrides')[0]!;
const BASE = 'https://localhost:3000/';

const one = (where: string) => {
  const found = nodesAt(manifest, where);
  expect(found, where).toHaveLength(1);
  return found[0]!;
};

/** What the build makes from which source. */
const SOURCES: Readonly<Record<string, string>> = {
  'taskpane.html': 'taskpane/taskpane.html',
  'index.html': 'workbook/page/index.html',
  'functions.js': 'functions/index.ts',
  'functions.json': 'functions/build/functionListPlugin.mjs',
};

describe('manifest.xml', () => {
  it('has the parts of an add-in-only task pane manifest, in the order that the schema asks for', () => {
    expect(manifest.name).toBe('OfficeApp');
    expect(manifest.attributes['xsi:type']).toBe('TaskPaneApp');
    // Order of the published schema, types OfficeApp and TaskPaneApp.
    expect(manifest.children.map(({ name }) => name)).toEqual([
      'Id',
      'Version',
      'ProviderName',
      'DefaultLocale',
      'DisplayName',
      'Description',
      'IconUrl',
      'HighResolutionIconUrl',
      'SupportUrl',
      'Hosts',
      'Requirements',
      'DefaultSettings',
      'Permissions',
      'VersionOverrides',
    ]);
    expect(one('Id').text).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
    expect(one('Version').text).toMatch(/^[1-9]\d{0,4}(\.\d{1,5}){3}$/);
    expect(one('Hosts/Host').attributes.Name).toBe('Workbook');
  });

  it('asks for the requirement sets that the code uses and for no more permission than it needs', () => {
    const sets = nodesAt(manifest, 'Requirements/Sets/Set').map(({ attributes }) => [
      attributes.Name,
      attributes.MinVersion,
    ]);
    expect(sets).toEqual([
      ['SharedRuntime', '1.1'],
      ['CustomFunctionsRuntime', '1.3'],
      ['ExcelApi', '1.11'],
    ]);
    expect(one('Permissions').text).toBe('ReadWriteDocument');
  });

  it('runs functions and pane in one long-lived page', () => {
    const runtime = one('VersionOverrides/Hosts/Host/Runtimes/Runtime');
    expect(runtime.attributes).toEqual({ resid: 'Taskpane.Url', lifetime: 'long' });
    // The shared runtime does not load unless all of these name the same resource.
    for (const where of ['**/Page/SourceLocation', '**/Action/SourceLocation']) {
      expect(nodesAt(overrides, where).map(({ attributes }) => attributes.resid)).toEqual(['Taskpane.Url']);
    }
    expect(nodesAt(overrides, 'Hosts/Host')[0]?.children[0]?.name).toBe('Runtimes');
    expect(nodesAt(overrides, '**/TaskpaneId')).toEqual([]);
  });

  it('has one button, and it opens the pane', () => {
    const controls = nodesAt(overrides, '**/Control');
    expect(controls.map(({ attributes }) => attributes['xsi:type'])).toEqual(['Button']);
    expect(nodesAt(overrides, '**/Action').map(({ attributes }) => attributes['xsi:type'])).toEqual(['ShowTaskpane']);
  });

  it('uses every resource, defines every one it uses, and keeps to the lengths allowed', () => {
    const resources = nodesAt(overrides, 'Resources')[0]!.children.flatMap((kind) => kind.children);
    const ids = resources.map(({ attributes }) => attributes.id);
    expect(new Set(ids).size).toBe(ids.length);
    const used = [...text.matchAll(/resid="([^"]+)"/g)].map((match) => match[1]);
    expect(new Set(used)).toEqual(new Set(ids));
    // Lengths: documentation of the Resources element.
    for (const id of ids) expect(id?.length).toBeLessThanOrEqual(32);
    for (const { attributes } of nodesAt(overrides, '**/bt:ShortStrings/bt:String')) {
      expect(attributes.DefaultValue?.length).toBeLessThanOrEqual(125);
    }
    for (const { attributes } of nodesAt(overrides, '**/bt:LongStrings/bt:String')) {
      expect(attributes.DefaultValue?.length).toBeLessThanOrEqual(250);
    }
  });

  it('leads only to files that the build makes', () => {
    const config = readFileSync(path.join(root, 'webpack.config.js'), 'utf8');
    const urls = [...text.matchAll(/DefaultValue="(https:[^"]+)"/g)].map((match) => match[1] ?? '');
    expect(urls.length).toBeGreaterThan(9);
    for (const url of urls) {
      expect(url.startsWith(BASE), url).toBe(true);
      const file = url.slice(BASE.length);
      const source = file.startsWith('icons/') ? `manifest/${file}` : SOURCES[file];
      expect(source, file).toBeDefined();
      expect(existsSync(path.join(root, source ?? '')), source).toBe(true);
    }
    for (const made of [
      'taskpane.html',
      'index.html',
      "functions: './functions/index.ts'",
      "output: 'functions.json'",
    ]) {
      expect(config).toContain(made);
    }
  });

  it('names no other host than the schemas and the local one', () => {
    const hosts = [...text.matchAll(/https?:\/\/([^/"<\s]+)/g)].map((match) => match[1]);
    expect(new Set(hosts)).toEqual(new Set(['schemas.microsoft.com', 'www.w3.org', 'localhost:3000']));
  });

  it('gives the functions the namespace that every other place uses', () => {
    const resid = nodesAt(overrides, '**/Namespace')[0]?.attributes.resid;
    const namespace = nodesAt(overrides, '**/bt:String').find(({ attributes }) => attributes.id === resid);
    expect(namespace?.attributes.DefaultValue).toBe(NAMESPACE);
    expect(NAMESPACE).toMatch(/^[A-Z]+$/);
  });
});

describe('taskpane.html', () => {
  const html = readFileSync(path.join(root, 'taskpane/taskpane.html'), 'utf8');

  it('loads the platform, then the functions, then the boot, all from its own folder', () => {
    const scripts = [...html.matchAll(/<script src="([^"]+)"/g)].map((match) => match[1]);
    expect(scripts).toEqual(['office/office.js', 'functions.js', 'taskpane.js']);
    expect(html).not.toMatch(/https?:\/\//);
  });

  it('forbids everything that it does not need', () => {
    const policy = /Content-Security-Policy"\s+content="([^"]+)"/.exec(html)?.[1] ?? '';
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("script-src 'self';");
    expect(policy).not.toContain('unsafe-eval');
    expect(policy).not.toMatch(/https?:/);
  });
});
