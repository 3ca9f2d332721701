import { Notice } from '@/components/ui/notice'
import type { DeviceRecord } from '@/db/queries/devices'
import { Breadcrumb } from './heading'

/** A device on the bench of which no edition has figures yet. */
export function Unreleased({ record }: { record: DeviceRecord }) {
  return (
    <main className="measure py-10">
      <Breadcrumb maker={record.maker} />
      <h1 className="mt-4">{record.name}</h1>
      <Notice className="mt-6 max-w-[60ch]">
        No figures of this device have been released yet. They will be here with the next edition.
      </Notice>
    </main>
  )
}
