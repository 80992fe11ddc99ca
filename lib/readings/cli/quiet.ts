/**
 * Standard output belongs to the result: from here on what anything else prints goes to standard error. The first import
 * of each command, because libraries print while they are loaded.
 */
export const print: typeof process.stdout.write = process.stdout.write.bind(process.stdout);

process.stdout.write = process.stderr.write.bind(process.stderr);
