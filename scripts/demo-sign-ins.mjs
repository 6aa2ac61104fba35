/** The invented people one can sign in as after `npm run db:seed`. The domain is reserved: no mail can reach anybody. */
export const DEMO_PASSWORD = 'copper-plate-demo'
export const DEMO_DOMAIN = 'quillham-charging.example'

export const demoSignIns = [
  { who: 'Office · Priya Nandakumar', email: `office@${DEMO_DOMAIN}`, password: DEMO_PASSWORD },
  { who: 'Installer · Tomasz Wilk', email: `installer@${DEMO_DOMAIN}`, password: DEMO_PASSWORD },
  { who: 'Supervisor · Rhiannon Pryce', email: `supervisor@${DEMO_DOMAIN}`, password: DEMO_PASSWORD },
  { who: 'Principal · Desmond Achebe', email: `principal@${DEMO_DOMAIN}`, password: DEMO_PASSWORD },
]
