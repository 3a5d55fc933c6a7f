// The theme's colours as the graphics card wants them, read where they are defined and read again when the theme turns.
import { useEffect, useState } from "react";

const TOKENS = { print: "--board-print", inside: "--board-inside", core: "--board-core", ink: "--ink", lit: "--wash", cast: "--cast", crease: "--layer-crease", live: "--live-line" } as const;
export type Colours = Readonly<Record<keyof typeof TOKENS, string>>;

function read(): Colours {
  const probe = document.createElement("span");
  document.body.append(probe);
  const entries = Object.entries(TOKENS).map(([name, token]) => {
    probe.style.color = `var(${token})`;
    return [name, getComputedStyle(probe).color];
  });
  probe.remove();
  return Object.fromEntries(entries) as Record<keyof typeof TOKENS, string>;
}

export function useColours(): Colours {
  const [colours, setColours] = useState(read);
  useEffect(() => {
    const again = () => setColours(read());
    const watch = new MutationObserver(again);
    watch.observe(document.documentElement, { attributes: true });
    const dark = matchMedia("(prefers-color-scheme: dark)");
    dark.addEventListener("change", again);
    return () => {
      watch.disconnect();
      dark.removeEventListener("change", again);
    };
  }, []);
  return colours;
}
