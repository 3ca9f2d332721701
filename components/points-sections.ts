import type { RankedDevice } from '@/lib/method/types'
import type { Paging } from './ui/pager'

/** Rows of the points table under one heading. */
type Section = { title: string; rows: RankedDevice[] }

/** The groups as the table names them; devices that stand alone one after another share one heading. */
export function sectionsOf(groups: readonly (readonly RankedDevice[])[]): Section[] {
  const sections: (Section & { alone: boolean })[] = []
  groups.forEach((group, i) => {
    const alone = group.length === 1
    const last = sections.at(-1)
    if (i > 1 && alone && last?.alone) {
      last.rows.push(...group)
      return
    }
    sections.push({ title: titleOf(i, alone, groups[0]?.length ?? 0), rows: [...group], alone })
  })
  return sections
}

function titleOf(index: number, alone: boolean, ahead: number): string {
  if (index === 0) return alone ? 'Ahead of the others' : 'Too close to call'
  return `${index > 1 ? 'Behind those' : ahead === 1 ? 'Behind it' : 'Behind them'}${alone ? '' : ', too close to call'}`
}

/** Only the rows of one page, under the headings they belong to. */
export function onPage(sections: Section[], paging: Paging | undefined): Section[] {
  if (!paging) return sections
  const [from, to] = [(paging.page - 1) * paging.perPage, paging.page * paging.perPage]
  let before = 0
  return sections.flatMap((section) => {
    const rows = section.rows.filter((_, i) => before + i >= from && before + i < to)
    before += section.rows.length
    return rows.length > 0 ? [{ ...section, rows }] : []
  })
}
