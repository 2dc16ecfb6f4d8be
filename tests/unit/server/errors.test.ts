import { describe, expect, it } from 'vitest'
import { OutOfRangeError, RunInputError, ThermometryError } from '#shared/thermometry'
import { PROBLEM_CODES } from '#shared/types/problem'
import { databaseErrno, isConnectionFailure, isDeadlock, isDuplicate } from '~~/server/db/errors'
import { AppError, conflict, invalidField, notFound, toProblem } from '~~/server/http/appError'
import { toAppError } from '~~/server/http/toAppError'

/** As drizzle throws it: the driver's error is the cause. */
function fromDatabase(errno: number, message = 'refused'): Error {
  const cause = Object.assign(new Error(message), { errno, sqlState: '23000', code: 'ER_MISLEADING' })
  return new Error('Failed query', { cause })
}

describe('the database says by number what it refused', () => {
  it('however deep the number is buried', () => {
    expect(databaseErrno(fromDatabase(1062))).toBe(1062)
    expect(databaseErrno(new Error('outer', { cause: fromDatabase(4025) }))).toBe(4025)
    expect(databaseErrno(new Error('ours'))).toBeUndefined()
    expect(databaseErrno('text')).toBeUndefined()
  })

  it('and a number of the operating system is not its', () => {
    const refused = Object.assign(new Error('connect'), { errno: -111, code: 'ECONNREFUSED' })
    expect(databaseErrno(refused)).toBeUndefined()
    expect(isConnectionFailure(new Error('Failed query', { cause: refused }))).toBe(true)
    expect(isConnectionFailure(fromDatabase(1062))).toBe(false)
  })

  it('which key it was', () => {
    const duplicate = fromDatabase(1062, "Duplicate entry '1-EGT 1' for key 'channels_aircraft_tag'")
    expect(isDuplicate(duplicate)).toBe(true)
    expect(isDuplicate(duplicate, 'channels_aircraft_tag')).toBe(true)
    expect(isDuplicate(duplicate, 'channels_aircraft')).toBe(false)
    expect(isDuplicate(fromDatabase(1452), 'channels_aircraft_tag')).toBe(false)
  })

  it('that another transaction was in the way', () => {
    expect(isDeadlock(fromDatabase(1213))).toBe(true)
    expect(isDeadlock(fromDatabase(1062))).toBe(false)
  })
})

describe('whatever is thrown becomes the one error there is an answer for', () => {
  it.each([
    [1062, 'conflict', 409],
    [1451, 'conflict', 409],
    [1452, 'conflict', 409],
    [4025, 'conflict', 409],
    [1213, 'unavailable', 503],
    [1205, 'unavailable', 503],
  ])('database error %i: %s', (errno, code, status) => {
    expect(toAppError(fromDatabase(errno))).toMatchObject({ code, status })
  })

  it('a field of a run is named', () => {
    expect(toAppError(new RunInputError('joints.1.tipSideZone', 'No temperature.'))).toMatchObject({
      code: 'invalid-input',
      status: 422,
      errors: [{ field: 'run.joints.1.tipSideZone', reason: 'No temperature.' }],
    })
  })

  it('a range names itself', () => {
    const error = toAppError(new OutOfRangeError('type K temperature', 2000, -270, 1372, '°C'))
    expect(error).toMatchObject({ code: 'out-of-range', status: 422 })
    expect(error?.message).toContain('-270 to 1372 °C')
    expect(toAppError(new ThermometryError('other', 'No.'))).toMatchObject({ code: 'invalid-input' })
  })

  it('what is an answer already stays what it is', () => {
    const error = notFound('zone')
    expect(toAppError(error)).toBe(error)
  })

  it('what nobody foresaw is not explained away', () => {
    expect(toAppError(new TypeError('x is undefined'))).toBeUndefined()
    expect(toAppError(fromDatabase(1146))).toBeUndefined()
    expect(toAppError('text')).toBeUndefined()
  })
})

describe('a problem', () => {
  it.each(PROBLEM_CODES)('%s has a status and a title', (code) => {
    const problem = toProblem(new AppError(code, 'Because.'))
    expect(problem.status).toBeGreaterThanOrEqual(400)
    expect(problem).toMatchObject({ type: 'about:blank', detail: 'Because.', code })
    expect(problem.title).not.toBe('')
    expect(problem).not.toHaveProperty('errors')
  })

  it('carries fields and changes where there are some, and never the cause', () => {
    const cause = new Error('the password is hunter2')
    const changed = { version: 2, fields: [], changedBy: null, changedAt: null }
    const errors = [{ field: 'a', reason: 'b' }]
    const problem = toProblem(
      new AppError('stale-version', 'Stale.', { changed, errors, cause, status: 412 }),
    )
    expect(problem).toMatchObject({ changed, errors, status: 412 })
    expect(JSON.stringify(problem)).not.toContain('hunter2')
  })

  it('of one field says its reason twice: for the person and for the form', () => {
    expect(toProblem(invalidField('tag', 'Taken.'))).toMatchObject({
      detail: 'Taken.',
      errors: [{ field: 'tag', reason: 'Taken.' }],
    })
    expect(toProblem(conflict('Taken.'))).not.toHaveProperty('errors')
    expect(toProblem(conflict('Taken.', 'tag'))).toMatchObject({ status: 409, errors: [{ field: 'tag' }] })
  })
})
