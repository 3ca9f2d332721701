/** A file of comma-separated values as RFC 4180 writes them: one object a row, every cell as text. */
export function readCsv(text: string): Record<string, string>[] {
  if (!text.endsWith('\r\n')) throw new Error('the last line must end with CR LF')
  const [header = [], ...rows] = records(text)
  return rows.map((cells, line) => {
    if (cells.length !== header.length)
      throw new Error(`row ${line + 1} has ${cells.length} cells, the header ${header.length}`)
    return Object.fromEntries(header.map((name, i) => [name, cells[i]!]))
  })
}

function records(text: string): string[][] {
  const all: string[][] = []
  let row: string[] = []
  let at = 0
  while (at < text.length) {
    const { value, next } = text[at] === '"' ? quoted(text, at) : plain(text, at)
    row.push(value)
    if (text[next] === ',') at = next + 1
    else if (text.startsWith('\r\n', next)) {
      all.push(row)
      row = []
      at = next + 2
      continue
    } else throw new Error(`a cell ends at ${next} with neither comma nor CR LF`)
    if (at === text.length) throw new Error('the file ends inside a row')
  }
  return all
}

function plain(text: string, from: number) {
  let next = from
  while (next < text.length && !',"\r\n'.includes(text[next]!)) next += 1
  return { value: text.slice(from, next), next }
}

function quoted(text: string, from: number) {
  let value = ''
  for (let at = from + 1; at < text.length; at += 1) {
    if (text[at] !== '"') value += text[at]
    else if (text[at + 1] === '"') {
      value += '"'
      at += 1
    } else return { value, next: at + 1 }
  }
  throw new Error(`the quotes opened at ${from} are never closed`)
}
