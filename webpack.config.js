import path from 'node:path';
import { fileURLToPath } from 'node:url';
import CopyPlugin from 'copy-webpack-plugin';
import MetadataPlugin from 'custom-functions-metadata-plugin';
import { EsbuildPlugin } from 'esbuild-loader';
import webpack from 'webpack';
import { FunctionListPlugin, functionFiles } from './functions/build/functionListPlugin.mjs';
import { NoticePlugin } from './workbook/run/noticePlugin.mjs';
import { version } from './workbook/run/version.mjs';

const root = path.dirname(fileURLToPath(import.meta.url));
const at = (...parts) => path.join(root, ...parts);

const typescript = {
  test: /\.tsx?$/,
  loader: 'esbuild-loader',
  options: { target: 'es2020', jsx: 'automatic' },
};

const shared = {
  mode: 'production',
  context: root,
  devtool: false,
  module: { rules: [typescript, { test: /\.css$/, use: ['style-loader', 'css-loader'] }] },
  resolve: { extensions: ['.ts', '.tsx', '.mjs', '.js'] },
  performance: { hints: false },
  stats: 'errors-warnings',
  plugins: [new webpack.DefinePlugin({ LATENTRY_EDITION: JSON.stringify(version) })],
};

const minimizer = (target) => [new EsbuildPlugin({ target, css: true, legalComments: 'none' })];

/**
 * The bundle contract: one compilation, so that pane, page and functions share one settings store.
 * `functions` stands by itself (it also runs in Node); `taskpane` and `page` depend on it.
 */
const bundle = {
  ...shared,
  name: 'bundle',
  target: ['web', 'es2020'],
  entry: {
    // Without a chunk-loading runtime of its own: a second one in the page would run every chunk twice.
    'host-shim': { import: './workbook/page/shim.ts', runtime: false },
    functions: './functions/index.ts',
    taskpane: { import: './taskpane/main.ts', dependOn: 'functions' },
    page: { import: './workbook/page/main.ts', dependOn: 'functions' },
  },
  output: {
    path: at('dist'),
    filename: '[name].js',
    chunkFilename: 'chunk-[name]-[contenthash:8].js',
    globalObject: 'globalThis',
    publicPath: '',
    clean: { keep: /^(latentry|lib\/|office\/|\.stamp|addin\/)/ },
  },
  optimization: { minimizer: minimizer('es2020') },
  plugins: [
    ...shared.plugins,
    new MetadataPlugin({ output: 'functions.json', input: functionFiles }),
    new FunctionListPlugin(),
    new NoticePlugin('THIRD-PARTY-NOTICES.txt'),
    new CopyPlugin({
      patterns: [
        { from: 'workbook/page/index.html', to: 'index.html', noErrorOnMissing: true },
        { from: 'taskpane/taskpane.html', to: 'taskpane.html', noErrorOnMissing: true },
        { from: 'manifest/icons/*.png', to: 'icons/[name][ext]', noErrorOnMissing: true },
        { from: 'manifest/icons/*.svg', to: 'icons/[name][ext]', noErrorOnMissing: true },
      ],
    }),
  ],
};

/** The command line with the headless engine, in one file. */
const command = {
  ...shared,
  name: 'command',
  target: 'node20',
  entry: { latentry: './workbook/cli/main.ts' },
  output: { path: at('dist'), filename: '[name].cjs', library: { type: 'commonjs2' } },
  optimization: { minimizer: minimizer('node20') },
  plugins: [
    ...shared.plugins,
    new NoticePlugin('latentry-THIRD-PARTY-NOTICES.txt'),
    new webpack.BannerPlugin({ banner: '#!/usr/bin/env node', raw: true, entryOnly: true }),
    new webpack.optimize.LimitChunkCountPlugin({ maxChunks: 1 }),
  ],
};

export default [bundle, command];
