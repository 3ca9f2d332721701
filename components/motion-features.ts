// Loaded after the page: rows can be read before they can glide.
export { domMax as default } from 'framer-motion'
