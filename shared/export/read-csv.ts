/** One record of a CSV text. */
export interface CsvRecord {
  /** From 1, as a spreadsheet counts: blank lines count, a quoted line break does not. */
  readonly row: number;
  readonly fields: readonly string[];
  /** Where its quotes are wrong; its fields are then not to be relied on. */
  readonly wrongQuotes?: string;
}

/** A field that began with a quote: its text, and where reading goes on. */
interface Quoted {
  readonly text: string;
  readonly next: number;
  readonly wrong?: string;
}

/**
 * Reads CSV, record by record, each in time that grows with its length alone: what is read may come from anybody.
 *
 * Lines end with CRLF or LF, the last one or not; a byte order mark is passed over, and so are blank lines. Quotes in a
 * field that does not begin with one stand for themselves.
 *
 * @returns never throws; a record whose quotes do not close is the last
 * @see RFC 4180, section 2
 */
export function* readCsv(text: string): Generator<CsvRecord> {
  let from = text.startsWith('\uFEFF') ? 1 : 0;
  for (let row = 1; from < text.length; row++) {
    const end = lineEnd(text, from);
    const line = text.slice(from, text[end - 1] === '\r' ? end - 1 : end);
    if (line.includes('"')) {
      const { next, ...record } = quotedRecord(text, from);
      yield { row, ...record };
      from = next;
    } else {
      if (line !== '') yield { row, fields: line.split(',') };
      from = end + 1;
    }
  }
}

/** @returns where the line's LF stands; the text's end where it has none */
function lineEnd(text: string, from: number): number {
  const end = text.indexOf('\n', from);
  return end < 0 ? text.length : end;
}

/** A record that has quotes somewhere, so that its first line may not be all of it. */
function quotedRecord(text: string, from: number): Omit<CsvRecord, 'row'> & { readonly next: number } {
  const fields: string[] = [];
  for (let at = from; ; at++) {
    const field = text[at] === '"' ? quotedField(text, at) : plainField(text, at);
    fields.push(field.text);
    at = field.next;
    if (field.wrong !== undefined) return { fields, wrongQuotes: field.wrong, next: lineEnd(text, at) + 1 };
    if (text[at] !== ',') return { fields, next: lineEnd(text, at) + 1 };
  }
}

/** Ends at a comma or at the line's end, whichever comes first. */
function plainField(text: string, from: number): Quoted {
  let next = from;
  while (next < text.length && text[next] !== ',' && text[next] !== '\n') next++;
  const end = text[next] !== ',' && text[next - 1] === '\r' ? next - 1 : next;
  return { text: text.slice(from, Math.max(end, from)), next };
}

/** A quote within the field is written twice. */
function quotedField(text: string, from: number): Quoted {
  const parts: string[] = [];
  for (let at = from + 1; ;) {
    const quote = text.indexOf('"', at);
    if (quote < 0) return { text: '', next: text.length, wrong: 'a quoted field does not end' };
    const twice = text[quote + 1] === '"';
    parts.push(text.slice(at, twice ? quote + 1 : quote));
    at = quote + 2;
    if (!twice) return afterQuote(text, parts.join(''), quote + 1);
  }
}

function afterQuote(text: string, field: string, next: number): Quoted {
  const ends = next >= text.length || /^(?:,|\r?\n|\r$)/.test(text.slice(next, next + 2));
  return ends
    ? { text: field, next }
    : { text: field, next, wrong: 'something follows the quote that ends a field' };
}
