import { registerEndpoint } from '@nuxt/test-utils/runtime'

/** The shell asks who is signed in before it draws anything; component tests answer here. Import it for its effect. */
registerEndpoint('/api/me', () => ({ id: 'p1', name: 'Rowan Ashdown', email: 'rowan@example.test', roles: ['office'], firmId: 'f1', firmName: 'Larkfield Electrical', selfCountersign: false }))
