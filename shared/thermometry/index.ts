export * from './errors'
export * from './its90'
export * from './thermoelements'
export * from './run'
