/** Where the files are while they are developed; every address in manifest.xml and functions.json begins with it. */
export const LOCAL_BASE = 'https://localhost:3000';

/** The address of a host folder in one spelling; throws with words where it cannot serve an add-in. */
export function hostBase(text) {
  let url;
  try {
    url = new URL(text);
  } catch {
    throw new Error(`address: allowed https://host/path; received "${text}"`);
  }
  if (url.protocol !== 'https:' || url.search !== '' || url.hash !== '' || url.username !== '') {
    throw new Error(`address: allowed https without query, fragment or user; received "${text}"`);
  }
  return url.href.replace(/\/+$/, '');
}

/** The text with every local address moved to the host folder. */
export function stampBase(text, base) {
  const escaped = base.replace(/&/g, '&amp;').replace(/"/g, '&quot;');
  return text.replaceAll(LOCAL_BASE, text.trimStart().startsWith('<') ? escaped : base);
}
