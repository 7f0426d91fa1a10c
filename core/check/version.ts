/** Version of the program, printed on every sheet and part of every fingerprint. Kept equal to package.json by a test. */
export const VERSION = '0.1.0';
