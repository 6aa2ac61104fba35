import { expect, it } from 'vitest'
import * as z from 'zod'
import { formSchema } from '../../../app/utils/formSchema'

const supply = z.object({
  mainFuseAmps: z.number('Enter the rating marked on the main fuse').positive('Enter the rating marked on the main fuse'),
  legs: z.array(z.object({ length_m: z.number('Enter the length') })).default([]),
})

it('hands on what parses', async () => {
  expect(await formSchema(supply).parse({ mainFuseAmps: 80 } as never)).toEqual({ value: { mainFuseAmps: 80, legs: [] }, errors: [] })
})

it('gives the schema’s own sentences per field, by vee-validate’s path', async () => {
  const { value, errors } = await formSchema(supply).parse({ legs: [{ length_m: 3 }, {}] } as never)
  expect(value).toBeUndefined()
  expect(errors).toEqual([
    { path: 'mainFuseAmps', errors: ['Enter the rating marked on the main fuse'] },
    { path: 'legs[1].length_m', errors: ['Enter the length'] },
  ])
})

it('gathers several sentences of one field', async () => {
  const name = z.object({ name: z.string().min(3, 'Write at least three letters').regex(/^[A-Z]/, 'Begin with a capital') })
  expect((await formSchema(name).parse({ name: 'a' })).errors).toEqual([{ path: 'name', errors: ['Write at least three letters', 'Begin with a capital'] }])
})

it('carries a refinement to the field it names', async () => {
  const span = z.object({ from: z.number(), to: z.number() }).refine(given => given.to > given.from, { path: ['to'], message: 'Ends before it begins' })
  expect((await formSchema(span).parse({ from: 3, to: 2 })).errors).toEqual([{ path: 'to', errors: ['Ends before it begins'] }])
})

it('reports the branch of a union that got furthest', async () => {
  const either = z.object({ reading: z.union([z.object({ value: z.number('Enter the figure') }), z.string()]) })
  expect((await formSchema(either).parse({ reading: {} } as never)).errors).toEqual([{ path: 'reading.value', errors: ['Enter the figure'] }])
})

it('leaves a draft’s starting values as they are', () => {
  const draft = { mainFuseAmps: 'eighty' }
  expect(formSchema(supply).cast?.(draft as never)).toBe(draft)
})
