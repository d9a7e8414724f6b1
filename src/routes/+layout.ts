// Every page is a file: the app runs from any static server, under any path.
export const prerender = true;
export const trailingSlash = 'always';
