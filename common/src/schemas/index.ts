export * from './fields';
export * from './parts';
export * from './specification-input';
export * from './company-settings';
export * from './people';
export * from './projects';
export * from './specifications';
export * from './standing-cautions';
