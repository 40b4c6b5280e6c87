export * from './people';
export * from './audit';
export * from './galaxies';
export * from './shows';
export * from './domes';
export * from './runs';
export * from './mails';
