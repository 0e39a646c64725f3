/**
 * Makes the first format of a page beside it. Making the very first takes a browser as long as making forty others, since it looks up what
 * languages it knows; it does so once for all threads, and here nobody waits for it.
 */
new Intl.DateTimeFormat(navigator.language, { weekday: 'long' }).format(0);
new Intl.NumberFormat(navigator.language, { style: 'currency', currency: 'EUR' }).format(0);
close();
