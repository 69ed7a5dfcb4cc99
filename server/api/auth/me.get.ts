import { defineRoute } from '#server/utils/define-route'

export default defineRoute({ auth: 'public' }, ({ account }) => ({ account }))
