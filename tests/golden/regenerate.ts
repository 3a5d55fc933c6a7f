// Writes the golden files anew: `npx tsx tests/golden/regenerate.ts [case …]`. Look at the difference before it is kept.
import { writeFileSync } from "node:fs";
import { filesOf, goldenCases, pathOf } from "./golden-files";

const wanted = process.argv.slice(2);
for (const name of wanted.length > 0 ? wanted : goldenCases) {
  for (const [file, text] of Object.entries(filesOf(name))) writeFileSync(pathOf(name, file), text);
  console.log(`${name}: written`);
}
