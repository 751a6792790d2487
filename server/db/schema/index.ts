export * from './deliveries';
export * from './freezers';
export * from './people';
export * from './producers';
export * from './records';
export * from './requests';
export * from './sensors';
export * from './stores';
