// A file identifier from its own content: not a secret, only the same for the same and different for different.

/** 32 hexadecimal digits: four FNV-1a sums of the text, each from another start. */
export function fingerprint(text: string): string {
  let digits = "";
  for (const seed of [0x811c9dc5, 0x1b873593, 0x85ebca6b, 0xc2b2ae35]) {
    let sum = seed;
    for (let i = 0; i < text.length; i++) sum = Math.imul(sum ^ text.charCodeAt(i), 0x01000193);
    digits += (sum >>> 0).toString(16).padStart(8, "0");
  }
  return digits.toUpperCase();
}
