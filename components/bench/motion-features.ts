// Loaded after the screen works: what lets a tag move from one place of it to another.
export { domMax as default } from 'framer-motion';
