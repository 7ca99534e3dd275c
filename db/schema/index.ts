export * from './post';
export * from './staff';
export * from './tester';
export * from './meet';
export * from './tag';
export * from './check';
export * from './record';
export * from './ledger';
