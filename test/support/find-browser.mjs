export default async function findBrowser() {}
