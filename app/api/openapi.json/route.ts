// The description of this interface, built from the routes themselves.
import { openApiSchema, describeInterface } from '@/lib/http/openapi'
import { endpoint, routes } from '@/lib/http/route'
import manifest from '@/package.json'
import { allRoutes } from '../all-routes'

const own = routes({
  GET: endpoint({
    summary: 'This description, OpenAPI 3.1', response: openApiSchema,
    handle: async () => ({ body: describeInterface({ ...allRoutes, '/api/openapi.json': own }, manifest.version) }),
  }),
})
export const { GET, POST, PUT, PATCH, DELETE } = own
