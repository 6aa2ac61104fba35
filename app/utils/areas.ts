/** The areas of the signed-in shell, as words in the top band. `roles` narrows who sees one; none means everybody. */
export interface Area { word: string, to: string, roles?: string[] }

export const AREAS: readonly Area[] = [
  { word: 'Today', to: '/' },
  { word: 'Diary', to: '/diary' },
  { word: 'Jobs', to: '/jobs' },
  { word: 'Countersign', to: '/countersign', roles: ['supervisor'] },
  { word: 'Notices', to: '/notices', roles: ['office', 'supervisor', 'principal'] },
  { word: 'Money', to: '/money', roles: ['office', 'principal'] },
  { word: 'Kit', to: '/kit' },
  { word: 'People', to: '/people', roles: ['principal'] },
  { word: 'Settings', to: '/settings', roles: ['principal'] },
]

/** The areas somebody with these roles has a use for. */
export function areasFor(roles: readonly string[]): Area[] {
  return AREAS.filter(area => !area.roles || area.roles.some(role => roles.includes(role)))
}

/** Whether a path lies in an area: the area's own page or anything below it. */
export function isInArea(path: string, area: Area): boolean {
  return path === area.to || (area.to !== '/' && path.startsWith(`${area.to}/`))
}
