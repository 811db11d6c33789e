/** Text that is HTML already. Only `html` makes it, so whatever else is put into a template is escaped. */
export class Html {
  readonly text: string;

  constructor(text: string) {
    this.text = text;
  }
}

type Part = string | number | Html | false | null | undefined | Part[];

const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

function toText(part: Part): string {
  if (part instanceof Html) return part.text;
  if (Array.isArray(part)) return part.map(toText).join('');
  if (part === false || part === null || part === undefined) return '';
  return String(part).replace(/[&<>"']/g, (character) => entities[character] ?? character);
}

/** A template whose values are escaped, except those that are `Html` themselves. Nothing and false leave no trace. */
export function html(strings: TemplateStringsArray, ...parts: Part[]): Html {
  return new Html(strings.map((text, index) => text + toText(parts[index])).join(''));
}
