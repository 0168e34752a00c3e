export * from './access';
export * from './coverage';
export * from './hours';
export * from './mail';
export * from './people';
export * from './roster';
export * from './sizing';
