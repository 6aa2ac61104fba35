/** Works as the owner inside one firm in a transaction: row security holds the owner too. */
export async function insideFirm(client, firmId, work) {
  await client.query('begin')
  await client.query('select set_config(\'app.firm_id\', $1, true)', [firmId])
  try {
    const result = await work()
    await client.query('commit')
    return result
  }
  catch (error) {
    await client.query('rollback')
    throw error
  }
}
