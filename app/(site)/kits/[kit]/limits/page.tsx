// The kit maker's own limits: what holds, what once held, and for stewards the form that enters one.
import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { LimitList } from '@/components/kits/limit-list'
import { PageTitle } from '@/components/layout/page-title'
import { Disclosure } from '@/components/ui/disclosure'
import { EmptyState } from '@/components/ui/empty-state'
import { FieldsForm } from '@/components/ui/fields-form'
import { pageContext } from '@/lib/auth/guards'
import { can } from '@/lib/policy/can'
import type { KitLimit } from '@/lib/schemas/kit-limits'
import { listLimits } from '@/lib/services/kits/list-limits'
import { listPlaces } from '@/lib/services/kits/list-places'
import { EnterLimit } from './_components/enter-limit'
import { endLimitAction } from './actions'

export const metadata: Metadata = { title: 'The maker’s limits' }

export default async function KitLimitsPage({ params, searchParams }: PageProps<'/kits/[kit]/limits'>) {
  const [context, { kit: slug }, { of }] = [await pageContext(), await params, await searchParams]
  const kit = (await listPlaces(context)).kits.find((each) => each.slug === slug)
  if (!kit) notFound()
  const { items, ended } = await listLimits(context, slug)
  const maySet = can(context.actor, 'kit.set-limits')
  const endOf = (limit: KitLimit) => (
    <Disclosure summary="End it" small>
      <FieldsForm action={endLimitAction} id={`end-${limit.id}`} hidden={{ kit: slug, limitId: limit.id }} button="End this limit" fields={[{ name: 'reason', label: 'Why it no longer holds', kind: 'area', maxLength: 1000, help: 'Such as the bulletin that replaces it. It stays on record.' }]} />
    </Disclosure>
  )
  return (
    <>
      <PageTitle kicker={`${kit.name} · ${kit.maker}`} title="The maker’s limits" lead="They come before the handbook’s: in the shop tables, in search and in the numbers check." />
      <Sheet as="section" labelledBy="in-force">
        <SheetHead title="In force" id="in-force" />
        {items.length === 0 ? <div className="sheet-body"><EmptyState title="None entered" level={3}><p>The shop tables give the handbook’s values. The plans and bulletins of {kit.maker} come first all the same.</p></EmptyState></div> : <LimitList kit={slug} limits={items} {...(maySet ? { endOf } : {})} />}
      </Sheet>
      {maySet ? <EnterLimit kit={slug} of={Array.isArray(of) ? of[0] : of} /> : null}
      {ended.length > 0 ? <Sheet as="section" labelledBy="ended"><SheetHead title="Ended" id="ended" /><LimitList kit={slug} limits={ended} /></Sheet> : null}
    </>
  )
}
