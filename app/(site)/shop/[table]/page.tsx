// One shop table with its inputs in the address: the figure, the number, cautions, every result with its source, what to know.
import type { Metadata, Route } from 'next'
import { notFound } from 'next/navigation'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { PageTitle } from '@/components/layout/page-title'
import { PlansWin } from '@/components/layout/plans-win'
import { PrintNote } from '@/components/layout/print-note'
import { ShopAnswerSheet } from '@/components/shop/shop-answer-sheet'
import { ShopContents } from '@/components/shop/shop-contents'
import { shopFieldId } from '@/components/shop/shop-form'
import { ShopResultList } from '@/components/shop/shop-result-list'
import { UnitsSwitch } from '@/components/shop/units-switch'
import { ErrorSummary } from '@/components/ui/error-summary'
import { LinkButton } from '@/components/ui/link-button'
import { PrintButton } from '@/components/ui/print-button'
import { pageContext } from '@/lib/auth/guards'
import { readerUnits } from '@/lib/auth/reader-units'
import { loadPage } from '@/lib/content/load-page'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'
import { env } from '@/lib/env'
import { firstSystem } from '@/lib/format/units-choice'
import { paths } from '@/lib/paths'
import { answerTable } from '@/lib/services/shop/answer-table'
import { listLimitKits } from '@/lib/services/kits/list-limit-kits'
import { loadMakerLimits } from '@/lib/services/kits/load-maker-limits'
import { shopCautions } from '@/lib/services/shop/shop-cautions'
import { readShopAddress } from './read-shop-address'

export async function generateMetadata({ params }: PageProps<'/shop/[table]'>): Promise<Metadata> {
  return { title: shopTable((await params).table)?.title ?? 'Shop tables' }
}

export default async function ShopTablePage({ params, searchParams }: PageProps<'/shop/[table]'>) {
  const context = await pageContext()
  const table = shopTable((await params).table)
  if (!table) notFound()
  const { raw, values, first, units, kit: asked } = readShopAddress(table, await searchParams, firstSystem(await readerUnits()))
  const kits = await listLimitKits(context, asked)
  const kit = kits.find(({ slug }) => slug === asked)
  const answered = answerTable(table, raw, { kit: kit?.slug, limits: await loadMakerLimits(context.reader, kit?.slug, table.slug) })
  const [answer, errors] = answered.ok ? [answered.answer, []] : [null, answered.errors]
  const unknownKit = asked && !kit ? [{ message: 'There is no kit of this name. These are the handbook’s values.' }] : []
  const note = await loadPage(table.slug, {}, 'shop-notes')
  const kept: Record<string, string> = kit ? { kit: kit.slug } : {}
  const address = answer?.url ?? paths.shopTable(table.slug, kept)
  const inUnits = (system: 'inch' | 'metric') => paths.shopTable(table.slug, { ...values, ...kept, units: system })
  return (
    <div className="shop-room">
      <ShopContents tables={SHOP_TABLES} current={table.slug} kit={kit?.slug} />
      <div className="shop-main">
        <PageTitle title={table.title} lead={note?.summary} aside={<UnitsSwitch first={first} hrefs={{ inch: inUnits('inch'), metric: inUnits('metric') }} />} />
        <ErrorSummary errors={[...errors.map(({ path, message }) => (table.inputs.some(({ name }) => name === path) ? { id: shopFieldId(path), message } : { message })), ...unknownKit]} />
        <ShopAnswerSheet table={table} answer={answer} values={values} errors={errors} first={first} units={units} kits={kits} kit={kit?.slug} />
        <CautionPlate cautions={shopCautions(table)} />
        {answer ? (
          <Sheet as="section" labelledBy="results">
            <SheetHead title="Every result, and whose it is" id="results" />
            <ShopResultList results={answer.results} first={first} />
          </Sheet>
        ) : null}
        {note ? <Sheet as="section" labelledBy="note"><SheetHead title={note.title} id="note" /><div className="sheet-body prose prose-small"><note.Content /></div></Sheet> : null}
        <PlansWin />
        <div className="button-row no-print">
          <PrintButton />
          {table.slug === 'drills' ? <LinkButton href={paths.drillChart}>Wall chart to print</LinkButton> : null}
          <LinkButton href={address as Route} look="quiet">Link to this answer</LinkButton>
        </div>
        <PrintNote address={`${env().publicUrl}${address}`} printedAt={context.now} />
      </div>
    </div>
  )
}
