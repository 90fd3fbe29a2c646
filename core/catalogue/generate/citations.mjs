/** Full citations in the order of their first use, named by their place. */
export function makeCitations(sources) {
  const texts = [];
  return {
    texts,
    place(key, detail) {
      const citation = sources[key];
      if (citation === undefined) throw new Error(`no citation for ${key}`);
      // a collection that quotes others ends in "which quotes"
      const quoting = citation.endsWith('which quotes');
      if (quoting && detail === undefined) throw new Error(`${key} does not say what it quotes`);
      const text = detail === undefined ? citation : `${citation}${quoting ? '' : ':'} ${detail}`;
      const known = texts.indexOf(text);
      return known >= 0 ? known : texts.push(text) - 1;
    },
  };
}
