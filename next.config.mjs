/** @type {import('next').NextConfig} */
const config = {
  serverExternalPackages: ['sequelize', 'mariadb'],
  poweredByHeader: false,
  experimental: { serverActions: { bodySizeLimit: '2mb' } },
}

export default config
