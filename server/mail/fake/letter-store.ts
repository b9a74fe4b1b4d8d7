import { mkdir, readdir, readFile, rm, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { type ParsedMail, simpleParser } from "mailparser";
import { v7 as uuid } from "uuid";

const mostKept = 200;

export interface LetterLine {
  id: string;
  to: string;
  subject: string;
  at: Date | null;
}

export interface KeptLetter extends LetterLine {
  from: string;
  html: string;
  text: string;
  headers: { key: string; line: string }[];
}

/** Keeps a letter as it came over the wire; the oldest go once there are 200. Names sort by time. */
export async function keepLetter(folder: string, raw: Buffer): Promise<void> {
  await mkdir(folder, { recursive: true });
  await writeFile(join(folder, `${uuid()}.eml`), raw);
  const ids = await letterIds(folder);
  await Promise.all(ids.slice(mostKept).map((id) => rm(join(folder, `${id}.eml`), { force: true })));
}

/** Newest first. */
async function letterIds(folder: string): Promise<string[]> {
  const names = await readdir(folder).catch(() => []);
  return names
    .filter((name) => name.endsWith(".eml"))
    .map((name) => name.slice(0, -".eml".length))
    .sort()
    .reverse();
}

/** Every kept letter's heading, newest first. */
export async function listLetters(folder: string): Promise<LetterLine[]> {
  const ids = await letterIds(folder);
  return Promise.all(
    ids.map(async (id) => {
      const raw = await readFile(join(folder, `${id}.eml`));
      const end = raw.indexOf("\r\n\r\n");
      return line(id, await simpleParser(end < 0 ? raw : raw.subarray(0, end + 4)));
    }),
  );
}

/** One letter whole, or null when there is none of this id. */
export async function readLetter(folder: string, id: string): Promise<KeptLetter | null> {
  if (!(await letterIds(folder)).includes(id)) return null;
  const mail = await simpleParser(await readFile(join(folder, `${id}.eml`)));
  return {
    ...line(id, mail),
    from: mail.from?.text ?? "",
    html: mail.html || "",
    text: mail.text ?? "",
    headers: mail.headerLines.map(({ key, line }) => ({ key, line })),
  };
}

function line(id: string, mail: ParsedMail): LetterLine {
  const to = [mail.to ?? []].flat().map((each) => each.text);
  return { id, to: to.join(", "), subject: mail.subject ?? "(no subject)", at: mail.date ?? null };
}
