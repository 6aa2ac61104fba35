import * as firstLoad from './first-load.mjs'
import * as growth from './growth.mjs'
import * as list from './list.mjs'
import * as meanwhile from './meanwhile.mjs'
import * as pack from './pack.mjs'
import * as statements from './statements.mjs'

/** Each says which figures it measures and measures them; figures that share their set-up share a file. */
export const FIGURES = [firstLoad, list, statements, growth, pack, meanwhile]
