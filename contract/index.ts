/** Everything that crosses HTTP, one file per resource. */
export * from './common';
export * from './problem';
export * from './plant-model';
export * from './controller';
export * from './loop';
export * from './analysis';
export * from './account';
export * from './permissions';
export * from './member';
export * from './project';
export * from './case';
export * from './plant';
export * from './kept-analysis';
export * from './design';
export * from './system';
