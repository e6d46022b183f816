/** Breaks a label between words into lines of at most `lineLength` characters; a longer word keeps its line. */
export function wrappedLabel(label: string, lineLength: number): string[] {
  const lines: string[] = [];
  for (const word of label.split(/\s+/).filter(Boolean)) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + 1 + word.length <= lineLength)
      lines[lines.length - 1] = `${last} ${word}`;
    else lines.push(word);
  }
  return lines;
}
