import { unescapeText } from './escapeXml';
import { scanXml } from './scanXml';

/**
 * Reads the table of shared texts; rich text gives its plain characters, phonetic hints are left out.
 *
 * @param xml - the part `sharedStrings.xml`, or `''`
 * @param part - its name, for refusals
 */
export function readStrings(xml: string, part: string): string[] {
  const strings: string[] = [];
  if (xml === '') return strings;
  let text = '';
  let inText = false;
  let phonetic = false;
  scanXml(xml, part, {
    open(name) {
      if (name === 'si') text = '';
      else if (name === 'rPh') phonetic = true;
      else if (name === 't') inText = !phonetic;
    },
    close(name) {
      if (name === 'si') strings.push(unescapeText(text));
      else if (name === 'rPh') phonetic = false;
      else if (name === 't') inText = false;
    },
    text(value) {
      if (inText) text += value;
    },
  });
  return strings;
}
