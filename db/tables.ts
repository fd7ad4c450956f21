/** Every table, one file per group. */
export * from './schema/account';
export * from './schema/team';
export * from './schema/project';
export * from './schema/invitation';
export * from './schema/plant';
export * from './schema/design';
export * from './schema/case';
export * from './schema/limits';
export * from './schema/analysis';
export * from './schema/http';
export * from './schema/mail';
