export { demonstrationPeople } from '../server/demonstration-people.ts';
