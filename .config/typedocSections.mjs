/** TypeDoc plugin: the fixed sections of our comments (Model, Validity, Accuracy, Source) become paragraphs with a bold head. */
import { Converter } from "typedoc";

const HEADS = /\n+(Model|Validity|Accuracy|Source):/g;

export function load(app) {
  app.converter.on(Converter.EVENT_RESOLVE, (_context, reflection) => {
    for (const part of reflection.comment?.summary ?? []) {
      if (part.kind === "text") part.text = part.text.replace(HEADS, "\n\n**$1:**");
    }
  });
}
