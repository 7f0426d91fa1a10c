const QUOTE = 0x22;
const BACKSLASH = 0x5c;
const ZERO = 0x30;
const POINT = 0x2e;

/** Bytes of a part that is the same each time. */
export const part = (json: string): Uint8Array => Buffer.from(json);

/** Writes JSON into one run of bytes that grows, each value as JSON.stringify has it. What is the same each time is given as bytes. */
export class JsonWriter {
  private bytes = Buffer.allocUnsafe(1 << 16);
  private at = 0;

  /** A copy of what was written; the writer begins anew. */
  taken(): Uint8Array<ArrayBuffer> {
    const all = new Uint8Array(this.bytes.subarray(0, this.at));
    this.at = 0;
    return all;
  }

  put(constant: Uint8Array): void {
    const { length } = constant;
    this.makeRoom(length);
    // Below this a loop is faster than a call.
    if (length > 24) this.bytes.set(constant, this.at);
    else for (let from = 0; from < length; from += 1) this.bytes[this.at + from] = constant[from]!;
    this.at += length;
  }

  text(value: string): void {
    this.makeRoom(3 * value.length + 2);
    const end = this.plainText(value);
    if (end < 0) this.fromEngine(JSON.stringify(value));
    else this.at = end;
  }

  number(value: number | null): void {
    this.makeRoom(32);
    if (value === null || !Number.isFinite(value)) this.ascii('null');
    else if (!this.short(value)) this.ascii(String(value));
  }

  private fromEngine(json: string): void {
    this.makeRoom(3 * json.length);
    this.at += this.bytes.write(json, this.at);
  }

  private makeRoom(more: number): void {
    if (this.at + more <= this.bytes.length) return;
    const wider = Buffer.allocUnsafe(2 * (this.at + more));
    wider.set(this.bytes.subarray(0, this.at));
    this.bytes = wider;
  }

  private ascii(text: string): void {
    const { bytes } = this;
    let { at } = this;
    for (let from = 0; from < text.length; from += 1) bytes[at++] = text.charCodeAt(from);
    this.at = at;
  }

  /** Writes a text in which nothing is to be escaped, and says where it ends; less than 0 for others. */
  private plainText(value: string): number {
    const { bytes } = this;
    let { at } = this;
    bytes[at++] = QUOTE;
    for (let from = 0; from < value.length; from += 1) {
      const code = value.charCodeAt(from);
      if (code < 0x80) {
        if (code < 0x20 || code === QUOTE || code === BACKSLASH) return -1;
        bytes[at++] = code;
      } else if (code < 0x800) {
        bytes[at++] = 0xc0 | (code >> 6);
        bytes[at++] = 0x80 | (code & 0x3f);
      } else {
        if (code >= 0xd800 && code < 0xe000) return -1;
        bytes[at++] = 0xe0 | (code >> 12);
        bytes[at++] = 0x80 | ((code >> 6) & 0x3f);
        bytes[at++] = 0x80 | (code & 0x3f);
      }
    }
    bytes[at++] = QUOTE;
    return at;
  }

  /** Writes a number of at most four places, as those of a curve are; false for others, whose figures only the engine finds. */
  private short(value: number): boolean {
    const scaled = Math.round(value * 1e4);
    if (!(scaled / 1e4 === value && scaled >= 0 && scaled <= 1e9)) return false;
    const whole = (scaled / 1e4) | 0;
    this.digits(whole);
    let rest = scaled - whole * 1e4;
    if (rest === 0) return true;
    const { bytes } = this;
    bytes[this.at++] = POINT;
    for (let reach = 1000; rest > 0; reach /= 10) {
      const digit = (rest / reach) | 0;
      bytes[this.at++] = ZERO + digit;
      rest -= digit * reach;
    }
    return true;
  }

  private digits(whole: number): void {
    let end = this.at + 1;
    for (let reach = 10; reach <= whole; reach *= 10) end += 1;
    let left = whole;
    for (let to = end - 1; to >= this.at; to -= 1) {
      const tens = (left / 10) | 0;
      this.bytes[to] = ZERO + left - tens * 10;
      left = tens;
    }
    this.at = end;
  }
}
