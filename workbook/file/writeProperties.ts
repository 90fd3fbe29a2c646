import { XML } from './baseParts';
import { escapeXml } from './escapeXml';
import { type PackageEdits, insertLast } from './packageEdits';
import { readRelations } from './relations';
import { attributeText } from './tagText';
import { applyEdits } from './textEdits';
import { childrenOf, xmlTree } from './xmlTree';

const PROPERTIES = 'http://schemas.openxmlformats.org/officeDocument/2006/custom-properties';
const VALUES = 'http://schemas.openxmlformats.org/officeDocument/2006/docPropsVTypes';
/** The one format id that custom properties have. Source: ECMA-376 part 1, 22.3.2.2. */
const FORMAT_ID = '{D5CDD505-2E9C-101B-9397-08002B2CF9AE}';
const EMPTY = `${XML}<Properties xmlns="${PROPERTIES}" xmlns:vt="${VALUES}"></Properties>`;

/**
 * Writes the small texts of a book as custom properties of the file; properties that stay keep their text.
 *
 * @param edits - the package
 * @param before - the texts as they were read
 * @param after - the texts to be kept
 */
export function writeProperties(
  edits: PackageEdits,
  before: Readonly<Record<string, string>>,
  after: Readonly<Record<string, string>>,
): void {
  if (JSON.stringify(before) === JSON.stringify(after)) return;
  const known = readRelations(edits, '').find(({ type }) => type === 'custom-properties')?.target;
  const part = known ?? edits.freeName((n) => `docProps/custom${n === 1 ? '' : n}.xml`);
  const xml = known === undefined ? EMPTY : edits.text(known);
  const nodes = childrenOf(xmlTree(xml, part), 'property');
  const gone = nodes.filter((node) => {
    const name = node.attributes['name'] ?? '';
    return name in before && before[name] !== after[name];
  });
  let text = applyEdits(
    xml,
    gone.map(({ start, end }) => ({ start, end, text: '' })),
  );
  let pid = Math.max(1, ...nodes.map((node) => Number(node.attributes['pid'])));
  for (const [name, value] of Object.entries(after)) {
    if (before[name] === value) continue;
    text = insertLast(
      text,
      part,
      `<property xmlns="${PROPERTIES}" fmtid="${FORMAT_ID}" pid="${++pid}" name="${attributeText(name)}">` +
        `<vt:lpwstr xmlns:vt="${VALUES}">${escapeXml(value)}</vt:lpwstr></property>`,
    );
  }
  if (known === undefined) {
    const content = 'application/vnd.openxmlformats-officedocument.custom-properties+xml';
    edits.add(part, text, { type: 'custom-properties', content }, '');
  } else edits.set(part, text);
}
