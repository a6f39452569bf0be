// Runs before the first paint so that a chosen theme does not flash; theme-choice.ts does the rest.
const chosen = localStorage.getItem('strandline.theme');
if (chosen === 'light' || chosen === 'dark') document.documentElement.classList.add(`theme-${chosen}`);
