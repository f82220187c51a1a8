export interface JsonFault {
  /** Both count from 1; the column counts UTF-16 units. */
  readonly line: number;
  readonly column: number;
  readonly message: string;
}

class Stop extends Error {
  readonly at: number;
  constructor(at: number, message: string) {
    super(message);
    this.at = at;
  }
}

const SPACE = /[ \t\r\n]*/uy;
const NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/uy;
const LITERAL = /true|false|null/uy;
// eslint-disable-next-line no-control-regex -- JSON itself bars control characters in strings (RFC 8259, 7)
const STRING = /"(?:[^"\\\u0000-\u001f]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"/y;
const WORD = /[^\s,:{}[\]]{1,20}/uy;

/** Walks JSON by the grammar of RFC 8259 without building anything; depth is bounded only by an explicit stack. */
class Walker {
  private at = 0;
  private readonly text: string;
  constructor(text: string) {
    this.text = text;
  }

  private take(pattern: RegExp): string | null {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text)?.[0] ?? null;
    if (found !== null) this.at += found.length;
    return found;
  }

  private fail(expected: string): never {
    if (this.at >= this.text.length) throw new Stop(this.at, `the text ends where ${expected} should stand`);
    WORD.lastIndex = this.at;
    const found = WORD.exec(this.text)?.[0] ?? this.text.charAt(this.at);
    throw new Stop(this.at, `${JSON.stringify(found)} stands where ${expected} should stand`);
  }

  private takeChar(chars: string, expected: string): string {
    this.take(SPACE);
    const char = this.text.charAt(this.at);
    if (char === '' || !chars.includes(char)) this.fail(expected);
    this.at += 1;
    return char;
  }

  private takeKey(): void {
    this.take(SPACE);
    if (this.take(STRING) === null) this.fail('a field name in double quotes');
    this.takeChar(':', '":"');
  }

  /** A value without children, or the opening of one with children: its closing bracket is returned. */
  private takeValue(): '}' | ']' | null {
    this.take(SPACE);
    const char = this.text.charAt(this.at);
    if (char === '{' || char === '[') {
      this.at += 1;
      return char === '{' ? '}' : ']';
    }
    if (this.take(STRING) === null && this.take(LITERAL) === null && this.take(NUMBER) === null)
      this.fail('a value');
    return null;
  }

  private closes(bracket: string): boolean {
    this.take(SPACE);
    if (this.text.charAt(this.at) !== bracket) return false;
    this.at += 1;
    return true;
  }

  walk(): void {
    const open: ('}' | ']')[] = [];
    for (;;) {
      const opened = this.takeValue();
      if (opened !== null && !this.closes(opened)) {
        open.push(opened);
        if (opened === '}') this.takeKey();
        continue;
      }
      for (;;) {
        const bracket = open.at(-1);
        if (bracket === undefined) {
          this.take(SPACE);
          if (this.at < this.text.length) this.fail('the end');
          return;
        }
        if (this.takeChar(`,${bracket}`, `"," or "${bracket}"`) === ',') {
          if (bracket === '}') this.takeKey();
          break;
        }
        open.pop();
      }
    }
  }
}

/** Where a text stops being JSON, or null if it is JSON. */
export function locateJsonError(text: string): JsonFault | null {
  try {
    new Walker(text).walk();
    return null;
  } catch (error) {
    if (!(error instanceof Stop)) throw error;
    const before = text.slice(0, error.at).split('\n');
    return { line: before.length, column: (before.at(-1) ?? '').length + 1, message: error.message };
  }
}
