import { defineCollection, z } from "astro:content";
import { glob } from "astro/loaders";

/** How each figure is reckoned, one page a section; `figure` is what its worked example opens. */
const methods = defineCollection({
  loader: glob({ pattern: "*.md", base: "./src/content/methods" }),
  schema: z.strictObject({
    section: z.number().int().min(1),
    title: z.string().max(60),
    question: z.string().max(80),
    answer: z.string().max(300),
    figures: z.array(z.string()).min(1),
  }),
});

export const collections = { methods };
