/** Reads what a test needs from a TrueType file: its tables, the characters it draws, its names. */
export const readFont = (bytes: Uint8Array) => {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const tables = new Map<string, DataView>();
  for (let i = 0; i < view.getUint16(4); i++) {
    const at = 12 + 16 * i;
    const tag = String.fromCharCode(...bytes.subarray(at, at + 4));
    tables.set(tag, new DataView(bytes.buffer, bytes.byteOffset + view.getUint32(at + 8), view.getUint32(at + 12)));
  }
  return {
    characters: charactersOf(tables.get('cmap')!),
    names: namesOf(tables.get('name')!),
    tags: [...tables.keys()],
  };
};

const charactersOf = (cmap: DataView): Set<string> => {
  const found = new Set<string>();
  const at = cmap.getUint32(8);
  const count = cmap.getUint16(at + 6) / 2;
  for (let s = 0; s < count; s++) {
    const end = cmap.getUint16(at + 14 + 2 * s);
    const start = cmap.getUint16(at + 16 + 2 * count + 2 * s);
    for (let code = start; code <= end && code < 0xffff; code++) found.add(String.fromCharCode(code));
  }
  return found;
};

const namesOf = (table: DataView): string[] => {
  const strings = table.getUint16(4);
  return Array.from({ length: table.getUint16(2) }, (_, i) => {
    const at = 6 + 12 * i;
    const from = strings + table.getUint16(at + 10);
    const units = Array.from({ length: table.getUint16(at + 8) / 2 }, (_, k) => table.getUint16(from + 2 * k));
    return String.fromCharCode(...units);
  });
};
