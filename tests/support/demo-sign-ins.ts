/** The demo's sign-ins, as `npm start` prints them. */
export { demoSignIns } from '../../scripts/demo-sign-ins.mjs'
