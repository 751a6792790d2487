/** The only link builder. */
export const paths = {
  home: () => '/',
  signIn: (next?: string) => (next && next !== '/' ? `/sign-in?next=${encodeURIComponent(next)}` : '/sign-in'),
  confirm: () => '/sign-in/confirm',
  profile: () => '/profile',
  stores: (producer: string, query = '') => `/${producer}/stores${query}`,
  store: (producer: string, storeId: string) => `/${producer}/stores/${storeId}`,
  storeDeliveries: (producer: string, storeId: string) => `/${producer}/stores/${storeId}/deliveries`,
  nextTruck: (producer: string, storeId: string) => `/${producer}/stores/${storeId}/next-truck`,
  recordDelivery: (producer: string, storeId: string) => `/${producer}/stores/${storeId}/deliveries/new`,
  report: (producer: string, storeId: string, freezerId?: string) =>
    `/${producer}/stores/${storeId}/report${freezerId ? `?freezer=${freezerId}` : ''}`,
  askForIce: (producer: string, storeId: string) => `/${producer}/stores/${storeId}/ask-for-ice`,
  requests: (producer: string, query = '') => `/${producer}/requests${query}`,
  request: (producer: string, requestId: string, query = '') => `/${producer}/requests/${requestId}${query}`,
  sensors: (producer: string) => `/${producer}/sensors`,
  quarantinedReadings: (producer: string) => `/${producer}/sensors/readings`,
  people: (producer: string) => `/${producer}/people`,
  invite: (producer: string) => `/${producer}/people/invite`,
  person: (producer: string, memberId: string) => `/${producer}/people/${memberId}`,
  changes: (producer: string) => `/${producer}/changes`,
  telemetryKeys: (producer: string) => `/${producer}/sensors/keys`,
};
