// Loaded after the first picture: the board is readable before it can move.
export { domMax as default } from 'framer-motion';
