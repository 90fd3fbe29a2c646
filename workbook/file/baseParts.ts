import { packPart } from './writeZip';
import { type Parts, openParts } from './parts';
import { writeZip } from './writeZip';

export const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
export const RELATIONS = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE = 'http://schemas.openxmlformats.org/package/2006';
export const XML = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
export const CONTENT = 'application/vnd.openxmlformats-officedocument.spreadsheetml';

export const EMPTY_RELATIONS = `${XML}<Relationships xmlns="${PACKAGE}/relationships"></Relationships>`;

/** The smallest sheet; whatever a book's sheet says is patched into it. */
export const EMPTY_SHEET =
  `${XML}<worksheet xmlns="${MAIN}" xmlns:r="${RELATIONS}"><sheetViews><sheetView workbookViewId="0"/></sheetViews>` +
  '<sheetFormatPr defaultRowHeight="15"/><sheetData/>' +
  '<pageMargins left="0.6" right="0.6" top="0.7" bottom="0.7" header="0.3" footer="0.3"/></worksheet>';

export const EMPTY_STYLES =
  `${XML}<styleSheet xmlns="${MAIN}">` +
  '<fonts count="1"><font><sz val="11"/><name val="Calibri"/><family val="2"/></font></fonts>' +
  '<fills count="2"><fill><patternFill patternType="none"/></fill><fill><patternFill patternType="gray125"/></fill></fills>' +
  '<borders count="1"><border><left/><right/><top/><bottom/><diagonal/></border></borders>' +
  '<cellStyleXfs count="1"><xf numFmtId="0" fontId="0" fillId="0" borderId="0"/></cellStyleXfs>' +
  '<cellXfs count="1"><xf numFmtId="0" fontId="0" fillId="0" borderId="0" xfId="0"/></cellXfs>' +
  '<cellStyles count="1"><cellStyle name="Normal" xfId="0" builtinId="0"/></cellStyles></styleSheet>';

const BASE: Readonly<Record<string, string>> = {
  '[Content_Types].xml':
    `${XML}<Types xmlns="${PACKAGE}/content-types">` +
    '<Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/>' +
    '<Default Extension="xml" ContentType="application/xml"/>' +
    `<Override PartName="/xl/workbook.xml" ContentType="${CONTENT}.sheet.main+xml"/>` +
    '<Override PartName="/docProps/app.xml" ContentType="application/vnd.openxmlformats-officedocument.extended-properties+xml"/></Types>',
  '_rels/.rels':
    `${XML}<Relationships xmlns="${PACKAGE}/relationships">` +
    `<Relationship Id="rId1" Type="${RELATIONS}/officeDocument" Target="xl/workbook.xml"/>` +
    `<Relationship Id="rId2" Type="${RELATIONS}/extended-properties" Target="docProps/app.xml"/></Relationships>`,
  'docProps/app.xml':
    `${XML}<Properties xmlns="http://schemas.openxmlformats.org/officeDocument/2006/extended-properties">` +
    '<Application>Latentry</Application></Properties>',
  'xl/workbook.xml':
    `${XML}<workbook xmlns="${MAIN}" xmlns:r="${RELATIONS}"><bookViews><workbookView xWindow="0" yWindow="0" ` +
    'windowWidth="26000" windowHeight="16000"/></bookViews><sheets></sheets></workbook>',
  'xl/_rels/workbook.xml.rels': EMPTY_RELATIONS,
};

/** A package without sheets: what a new book is patched into. */
export function baseParts(): Parts {
  const encoder = new TextEncoder();
  return openParts(writeZip(Object.entries(BASE).map(([name, text]) => packPart(name, encoder.encode(text)))));
}
