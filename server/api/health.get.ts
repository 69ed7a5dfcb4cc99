import { defineRoute } from '../utils/define-route'

export default defineRoute({ auth: 'public' }, () => ({ ok: true }))
