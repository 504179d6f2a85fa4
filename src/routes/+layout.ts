/** One page of files that runs in the browser alone, so that it also runs where no server answers. */
export const ssr = false;
export const prerender = true;
