/** Whether anything was said yet: until then the page goes without what shows it. */
export const toaster = $state({ wanted: false });
