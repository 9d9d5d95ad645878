import { readFile, writeFile } from "node:fs/promises";
import { basename, join } from "node:path";
import { promisify } from "node:util";
import { brotliCompress, constants } from "node:zlib";

const compress = promisify(brotliCompress);

/** Lays a compressed copy beside each script that browsers get: once, and as well as can be. */
export function readyScripts() {
  return {
    name: "ready-scripts",
    async writeBundle({ dir }, files) {
      if (basename(dir) !== "client") return;
      for (const name of Object.keys(files).filter((file) => file.endsWith(".js"))) {
        const plain = await readFile(join(dir, name));
        const params = { [constants.BROTLI_PARAM_SIZE_HINT]: plain.length };
        const ready = await compress(plain, { params });
        if (ready.length < plain.length) await writeFile(join(dir, `${name}.br`), ready);
      }
    },
  };
}
