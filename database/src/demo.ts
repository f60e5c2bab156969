export { DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from '../seeds/demo/people';
