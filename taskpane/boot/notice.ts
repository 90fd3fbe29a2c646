/** Shows one plain paragraph where the pane would stand, with a link where one helps. */
export function notice(
  element: HTMLElement,
  text: string,
  link?: { readonly text: string; readonly href: string },
): void {
  const paragraph = element.ownerDocument.createElement('p');
  paragraph.className = 'notice';
  paragraph.setAttribute('role', 'status');
  paragraph.append(text);
  if (link !== undefined) {
    const anchor = element.ownerDocument.createElement('a');
    anchor.href = link.href;
    anchor.textContent = link.text;
    paragraph.append(' ', anchor);
  }
  element.replaceChildren(paragraph);
}
