const slugPattern = /^[a-z0-9]+(?:-[a-z0-9]+)*$/;

/** True where the text is lower-case words and numbers joined by single hyphens, at most 64 characters. */
export function isSlug(text: string): boolean {
  return text.length <= 64 && slugPattern.test(text);
}

/**
 * Makes a slug of any title: letters lose their accents, everything else becomes a hyphen, at most 64 characters.
 * Gives an empty string where nothing of the title can stand in a slug.
 */
export function slugOf(title: string): string {
  return title
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 64)
    .replace(/^-+|-+$/g, '');
}
