// The wall chart of drill sizes, for one sheet of paper.
import type { Metadata } from 'next'
import { CautionLine } from '@/components/cautions/caution-line'
import { PageTitle } from '@/components/layout/page-title'
import { PrintNote } from '@/components/layout/print-note'
import { DrillChart } from '@/components/shop/drill-chart'
import { LinkButton } from '@/components/ui/link-button'
import { PrintButton } from '@/components/ui/print-button'
import { pageContext } from '@/lib/auth/guards'
import { DRILLS } from '@/lib/domain/shop/drill-series'
import { drillTable } from '@/lib/domain/shop/drill-table'
import { env } from '@/lib/env'
import { paths } from '@/lib/paths'
import { shopCautions } from '@/lib/services/shop/shop-cautions'

export const metadata: Metadata = { title: 'Drill sizes, wall chart' }

export default async function DrillChartPage() {
  const context = await pageContext()
  return (
    <article className="page-body">
      <div className="button-row no-print"><PrintButton /><LinkButton href={paths.shopTable('drills')}>Find one drill</LinkButton></div>
      <PageTitle title="Drill sizes" lead="Name, inches, millimetres. Number and letter series: ANSI/ASME B94.11M (1993). Fractions by 64ths, shaded." />
      <CautionLine cautions={shopCautions(drillTable)} />
      <DrillChart drills={DRILLS} />
      <PrintNote address={`${env().publicUrl}${paths.drillChart}`} printedAt={context.now} />
    </article>
  )
}
