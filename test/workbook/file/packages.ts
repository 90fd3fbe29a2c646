import { strToU8, zipSync } from 'fflate';

const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const REL = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PKG = 'http://schemas.openxmlformats.org/package/2006';

/** A package as another program might have made it: one sheet, and room for anything else. */
export function foreignParts(sheet: string, more: Record<string, string> = {}): Record<string, string> {
  return {
    '[Content_Types].xml':
      `<?xml version="1.0"?><Types xmlns="${PKG}/content-types"><Default Extension="xml" ContentType="application/xml"/>` +
      '<Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/>' +
      '<Override PartName="/xl/workbook.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml"/>' +
      '<Override PartName="/xl/worksheets/sheet1.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml"/>' +
      '<Override PartName="/xl/calcChain.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.calcChain+xml"/></Types>',
    '_rels/.rels': `<Relationships xmlns="${PKG}/relationships"><Relationship Id="rId1" Type="${REL}/officeDocument" Target="/xl/workbook.xml"/></Relationships>`,
    'xl/workbook.xml':
      `<workbook xmlns="${MAIN}" xmlns:r="${REL}"><workbookPr date1904="1"/><sheets><sheet name="Plant" sheetId="7" r:id="rId9"/></sheets>` +
      '<definedNames><definedName name="Area" comment="kept">Plant!$A$1:$A$3</definedName></definedNames><calcPr calcId="191029"/></workbook>',
    'xl/_rels/workbook.xml.rels':
      `<Relationships xmlns="${PKG}/relationships"><Relationship Id="rId9" Type="${REL}/worksheet" Target="worksheets/sheet1.xml"/>` +
      `<Relationship Id="rId2" Type="${REL}/sharedStrings" Target="sharedStrings.xml"/><Relationship Id="rId3" Type="${REL}/styles" Target="styles.xml"/>` +
      `<Relationship Id="rId4" Type="${REL}/calcChain" Target="calcChain.xml"/></Relationships>`,
    'xl/worksheets/sheet1.xml': sheet,
    'xl/calcChain.xml': `<calcChain xmlns="${MAIN}"><c r="B1" i="7"/></calcChain>`,
    'xl/sharedStrings.xml': `<sst xmlns="${MAIN}"><si><t>feed</t></si><si><r><t>kelp </t></r><r><rPr><b/></rPr><t>extract</t></r><rPh sb="0" eb="1"><t>x</t></rPh></si></sst>`,
    'xl/styles.xml':
      `<styleSheet xmlns="${MAIN}"><numFmts count="1"><numFmt numFmtId="170" formatCode="0.0&quot; °C&quot;"/></numFmts>` +
      '<fonts count="2"><font><sz val="10"/><name val="Arial"/></font><font><b/><sz val="10"/><name val="Arial"/></font></fonts>' +
      '<fills count="1"><fill><patternFill patternType="none"/></fill></fills><borders count="1"><border/></borders>' +
      '<cellStyleXfs count="1"><xf/></cellStyleXfs><cellXfs count="3"><xf/><xf numFmtId="14" fontId="0"/><xf numFmtId="170" fontId="1" quotePrefix="1"/></cellXfs>' +
      '<dxfs count="1"><dxf><font><b/></font></dxf></dxfs></styleSheet>',
    ...more,
  };
}

export const worksheet = (inside: string, prefix = ''): string => {
  const xmlns = prefix === '' ? `xmlns="${MAIN}"` : `xmlns:${prefix.slice(0, -1)}="${MAIN}"`;
  return `<${prefix}worksheet ${xmlns} xmlns:r="${REL}">${inside}</${prefix}worksheet>`;
};

export const zipOf = (parts: Record<string, string>): Uint8Array =>
  zipSync(Object.fromEntries(Object.entries(parts).map(([name, text]) => [name, strToU8(text)])));
