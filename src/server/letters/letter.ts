/** A letter as it goes out: the same words as plain text and as simple HTML. */
export interface Letter {
  to: string;
  subject: string;
  text: string;
  html: string;
}

/** What a letter says; the frame turns it into both forms. */
interface Words {
  to: string;
  subject: string;
  /** Before the link. */
  says: string[];
  /** The one thing to press, and where it leads. */
  action?: { words: string; link: string };
  /** After the link, such as how long it works. */
  ends: string[];
}

function escaped(text: string): string {
  const entities: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" };
  return text.replace(/[&<>"]/g, (sign) => entities[sign] ?? sign);
}

function paragraph(text: string): string {
  return `<p style="margin:0 0 16px">${escaped(text)}</p>`;
}

/** Sets a letter in both forms. What people typed, such as names, is escaped in the HTML. */
export function letter({ to, subject, says, action, ends }: Words): Letter {
  const signature = "Tinpenny";
  const text = [...says, ...(action ? [`${action.words}:\n${action.link}`] : []), ...ends, signature];
  const button = action
    ? `<p style="margin:0 0 16px"><a href="${escaped(action.link)}" style="color:#0b5064;font-weight:600">${escaped(action.words)}</a></p>`
    : "";
  const body = says.map(paragraph).join("") + button + [...ends, signature].map(paragraph).join("");
  return {
    to,
    subject,
    text: `${text.join("\n\n")}\n`,
    html: `<!doctype html><html lang="en"><body style="font:17px/26px sans-serif;color:#1b2322;max-width:36em">${body}</body></html>`,
  };
}
