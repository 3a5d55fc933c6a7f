export type Read = { ok: true; mm: number } | { ok: false; sentence: string };
export const readLength = (text: string): Read => {
  const n = Number(text);
  return Number.isFinite(n) ? { ok: true, mm: n } : { ok: false, sentence: `“${text}” is no length.` };
};
