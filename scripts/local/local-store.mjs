/** The bucket and the account that `npm start` gives the web process for the local file store. */
export const localStore = { bucket: 'holdoff', accessKey: 'S3RVER', secretKey: 'S3RVER' };
