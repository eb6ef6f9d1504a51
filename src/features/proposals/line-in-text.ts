/** Where a line of a text begins and ends, counted from 1; the last line where there are fewer. */
export function lineSpan(text: string, line: number): { readonly start: number; readonly end: number } {
  let start = 0;
  for (let at = 1; at < line; at += 1) {
    const newline = text.indexOf('\n', start);
    if (newline < 0) break;
    start = newline + 1;
  }
  const newline = text.indexOf('\n', start);
  return { start, end: newline < 0 ? text.length : newline };
}

/** Goes to a line of a text that is being written: selects it and brings it into sight. */
export function goToLine(textarea: HTMLTextAreaElement, line: number): void {
  const { start, end } = lineSpan(textarea.value, line);
  textarea.focus({ preventScroll: true });
  textarea.setSelectionRange(start, end);
  // A third down, so that what stands before it can be read too.
  textarea.scrollTop = heightBefore(textarea, start) - textarea.clientHeight / 3;
  textarea.scrollIntoView({ block: 'nearest' });
}

/** How far down a place of the text lies, with long lines wrapped as they are. */
function heightBefore(textarea: HTMLTextAreaElement, place: number): number {
  const probe = textarea.cloneNode() as HTMLTextAreaElement;
  probe.removeAttribute('id');
  probe.removeAttribute('name');
  probe.setAttribute('aria-hidden', 'true');
  probe.tabIndex = -1;
  Object.assign(probe.style, {
    position: 'absolute',
    visibility: 'hidden',
    height: '0',
    minHeight: '0',
    width: `${String(textarea.offsetWidth)}px`,
  });
  probe.value = textarea.value.slice(0, place);
  textarea.after(probe);
  const height = probe.scrollHeight;
  probe.remove();
  return height;
}
