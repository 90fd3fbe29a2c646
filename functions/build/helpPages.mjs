import { loadModule } from './enumLists.mjs';

/** One help page a function and an index, made from the finished list of functions and the published checks. */
export function helpPages(list) {
  const { checkList: checks } = loadModule('functions/checks/checkList.ts');
  const { formulaOf } = loadModule('functions/checks/check.ts');
  const pages = list.functions.map((entry) => [
    `help/${entry.id.toLowerCase()}.html`,
    page(
      `LATENTRY.${entry.id}`,
      functionBody(
        entry,
        checks.filter((check) => check.call === entry.id),
        formulaOf,
      ),
    ),
  ]);
  const items = list.functions.map(
    (f) => `<li><a href="${f.id.toLowerCase()}.html">LATENTRY.${f.id}</a> — ${escape(f.description)}</li>`,
  );
  return [...pages, ['help/index.html', page('Latentry functions', `<ul>${items.join('\n')}</ul>`)]];
}

function functionBody(entry, checks, formulaOf) {
  const names = entry.parameters.map((p) => (p.repeating ? `[${p.name}…]` : p.optional ? `[${p.name}]` : p.name));
  const rows = entry.parameters.map(
    (p) => `<tr><th scope="row">${escape(p.name)}</th><td>${escape(p.description ?? '')}</td></tr>`,
  );
  const examples = checks.map(
    (check) =>
      `<tr><td><code>${escape(formulaOf(check))}</code>${check.pick ? ` (${escape(check.pick.label)})` : ''}</td>` +
      `<td>${check.expected}</td><td>±${check.within}: ${escape(check.because)}</td><td>${escape(check.source)}</td></tr>`,
  );
  return [
    `<p>${escape(entry.description ?? '')}</p>`,
    `<p><code>=LATENTRY.${entry.id}(${escape(names.join(', '))})</code></p>`,
    rows.length === 0 ? '' : `<table><caption>Arguments</caption>${rows.join('\n')}</table>`,
    examples.length === 0
      ? ''
      : '<div class="wide" tabindex="0" role="region" aria-label="Published values"><table><caption>Published values that it reproduces</caption>' +
        '<tr><th scope="col">Formula</th><th scope="col">Published</th><th scope="col">Within</th><th scope="col">Source</th></tr>' +
        `${examples.join('\n')}</table></div>`,
    '<p><a href="index.html">All functions</a></p>',
  ].join('\n');
}

const STYLE = `
body { font: 1rem/1.5 system-ui, sans-serif; max-width: 60rem; margin: 2rem auto; padding: 0 1rem; color: #16302b; background: #fbfaf6; }
h1 { font-size: 1.4rem; } caption { text-align: left; font-weight: 600; padding: .5rem 0; }
table { border-collapse: collapse; } th, td { text-align: left; vertical-align: top; padding: .3rem .8rem .3rem 0; border-top: 1px solid #cfd8d3; }
code { overflow-wrap: anywhere; } .wide { overflow-x: auto; } a { color: #1b5e50; }
@media (prefers-color-scheme: dark) { body { color: #e4ece8; background: #14211e; } a { color: #8fd3c1; } th, td { border-color: #3a4f49; } }
footer { margin-top: 2rem; font-size: .85rem; }`;

function page(title, body) {
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escape(title)}</title><style>${STYLE}</style></head>
<body><main><h1>${escape(title)}</h1>
${body}
</main><footer>Answers serve engineering calculation. Where they touch pressure, steam, cryogens, flammable vapour, relief or refrigeration sizing, or food and drug processes, local codes and licensed practice decide.</footer></body></html>
`;
}

function escape(text) {
  return String(text).replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;').replace(/"/g, '&quot;');
}
