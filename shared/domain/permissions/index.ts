export * from './roles'
export * from './matrix'
export * from './routes'
