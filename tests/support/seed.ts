import fc from 'fast-check'

/**
 * Property tests draw the same cases at every run, so that a red run can be repeated and a green one says the same everywhere.
 * `SEED=random` (or a number) draws others: worth a run after every change of the engine.
 */
const given = process.env['SEED']
const seed = given === undefined ? 20_261_201 : given === 'random' ? Math.floor(Math.random() * 2 ** 31) : Number(given)
fc.configureGlobal({ ...fc.readConfigureGlobal(), seed })
