export { type ActionResult, accountAction, clubAction, publicAction } from './actions';
export { accountPage, clubPage, publicPage } from './pages';
export { accountRoute, clubRoute, publicRoute } from './routes';
