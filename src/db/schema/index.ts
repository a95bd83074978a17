export * from './accounts';
export * from './bookings';
export * from './clubs';
export * from './ground';
export * from './map';
export * from './operations';
export * from './outings';
export * from './weather';
