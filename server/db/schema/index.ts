export * from './catalogue'
export * from './trials'
export * from './fits'
export * from './facts'
