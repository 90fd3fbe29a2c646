/** Full citations in the order of their first use, named by their place. */
export function makeCitations(sources) {
  const texts = [];
  return {
    texts,
    place(key, detail) {
      const citation = sources[key];
      if (citation === undefined) throw new Error(`no citation for ${key}`);
      const text = detail === undefined ? citation : `${citation}: ${detail}`;
      const known = texts.indexOf(text);
      return known >= 0 ? known : texts.push(text) - 1;
    },
  };
}
