// Every route of the API by its address, except the description itself, which is built from this list.
// A test compares it with the folders, so that no route stays undescribed.
import type { Handler, Method } from '@/lib/http/route'
import * as answer from './answers/[id]/route'
import * as build from './builds/[id]/route'
import * as closing from './builds/[id]/closing/[item]/route'
import * as hold from './builds/[id]/holds/[hold]/route'
import * as holdRelease from './builds/[id]/holds/[hold]/release/route'
import * as logLine from './builds/[id]/log/[line]/route'
import * as buildSection from './builds/[id]/sections/[section]/route'
import * as holds from './builds/[id]/sections/[section]/holds/route'
import * as log from './builds/[id]/sections/[section]/log/route'
import * as builds from './builds/route'
import * as requiredCautions from './cautions/required/route'
import * as entry from './entries/[id]/route'
import * as answers from './entries/[id]/answers/route'
import * as entries from './entries/route'
import * as health from './health/route'
import * as importing from './import/route'
import * as endLimit from './kits/[kit]/limits/[id]/end/route'
import * as kitLimits from './kits/[kit]/limits/route'
import * as brief from './kits/[kit]/sections/[section]/brief/route'
import * as kit from './kits/[kit]/route'
import * as kits from './kits/route'
import * as measurements from './measurements/route'
import * as notices from './notices/route'
import * as closeNotice from './notices/[id]/close/route'
import * as numbersCheck from './numbers-check/route'
import * as operations from './operations/route'
import * as outcome from './posts/[id]/outcome/route'
import * as reliance from './posts/[id]/reliance/route'
import * as remarks from './posts/[id]/remarks/route'
import * as stamps from './posts/[id]/stamps/route'
import * as preview from './preview/route'
import * as explainSearch from './search/explain/route'
import * as search from './search/route'
import * as shopTable from './shop/[table]/route'
import * as shop from './shop/route'
import * as similar from './similar/route'
import * as withdraw from './stamps/[id]/withdraw/route'
import * as suggest from './suggest/route'

export const allRoutes: Record<string, Record<Method, Handler>> = {
  '/api/search': search,
  '/api/search/explain': explainSearch,
  '/api/suggest': suggest,
  '/api/similar': similar,
  '/api/preview': preview,
  '/api/entries': entries,
  '/api/entries/{id}': entry,
  '/api/entries/{id}/answers': answers,
  '/api/answers/{id}': answer,
  '/api/posts/{id}/remarks': remarks,
  '/api/posts/{id}/stamps': stamps,
  '/api/posts/{id}/outcome': outcome,
  '/api/posts/{id}/reliance': reliance,
  '/api/stamps/{id}/withdraw': withdraw,
  '/api/builds': builds,
  '/api/builds/{id}': build,
  '/api/builds/{id}/sections/{section}': buildSection,
  '/api/builds/{id}/sections/{section}/log': log,
  '/api/builds/{id}/sections/{section}/holds': holds,
  '/api/builds/{id}/log/{line}': logLine,
  '/api/builds/{id}/holds/{hold}': hold,
  '/api/builds/{id}/holds/{hold}/release': holdRelease,
  '/api/builds/{id}/closing/{item}': closing,
  '/api/cautions/required': requiredCautions,
  '/api/kits': kits,
  '/api/kits/{kit}': kit,
  '/api/kits/{kit}/limits': kitLimits,
  '/api/kits/{kit}/limits/{id}/end': endLimit,
  '/api/kits/{kit}/sections/{section}/brief': brief,
  '/api/operations': operations,
  '/api/notices': notices,
  '/api/notices/{id}/close': closeNotice,
  '/api/measurements': measurements,
  '/api/numbers-check': numbersCheck,
  '/api/shop': shop,
  '/api/shop/{table}': shopTable,
  '/api/import': importing,
  '/api/health': health,
}
