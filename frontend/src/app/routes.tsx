import type { RouteObject } from 'react-router-dom';
import { Layout } from './layout/layout';
import { NotFoundPage } from './not-found-page';
import { paths } from './paths';
import { RouteFault } from './route-fault';

/** Pages are fetched when they are first opened; the frame and the desk's data do not wait for them. */
export const routes: RouteObject[] = [
  {
    errorElement: <RouteFault />,
    hydrateFallbackElement: <></>,
    children: [
      {
        path: paths.signIn.pattern,
        lazy: async () => ({ Component: (await import('../sign-in/pages/sign-in-page')).SignInPage }),
      },
      {
        path: paths.invitation.pattern,
        lazy: async () => ({ Component: (await import('../account/pages/invitation-page')).InvitationPage }),
      },
      {
        path: paths.reset.pattern,
        lazy: async () => ({ Component: (await import('../account/pages/reset-page')).ResetPage }),
      },
      {
        path: paths.verify.pattern,
        lazy: async () => ({ Component: (await import('../verification/pages/verify-page')).VerifyPage }),
      },
      {
        element: <Layout />,
        children: [
          {
            errorElement: <RouteFault />,
            children: [
              {
                path: paths.desk.pattern,
                lazy: async () => ({ Component: (await import('../desk/pages/desk-page')).DeskPage }),
              },
              {
                path: paths.projects.pattern,
                lazy: async () => ({ Component: (await import('../projects/pages/projects-page')).ProjectsPage }),
              },
              {
                path: paths.project.pattern,
                lazy: async () => ({ Component: (await import('../projects/pages/project-page')).ProjectPage }),
              },
              {
                path: paths.designBasis.pattern,
                lazy: async () => ({
                  Component: (await import('../projects/pages/design-basis-page')).DesignBasisPage,
                }),
              },
              {
                path: paths.specification.pattern,
                lazy: async () => ({
                  Component: (await import('../specifications/pages/specification-page')).SpecificationPage,
                }),
              },
              {
                path: paths.approval.pattern,
                lazy: async () => ({ Component: (await import('../approval/pages/approval-page')).ApprovalPage }),
              },
              {
                path: paths.sheets.pattern,
                lazy: async () => ({ Component: (await import('../register/pages/register-page')).RegisterPage }),
              },
              {
                path: paths.issuedSheet.pattern,
                lazy: async () => ({
                  Component: (await import('../register/pages/issued-sheet-page')).IssuedSheetPage,
                }),
              },
              {
                path: paths.concessions.pattern,
                lazy: async () => ({ Component: (await import('../register/pages/concessions-page')).ConcessionsPage }),
              },
              {
                path: paths.revision.pattern,
                lazy: async () => ({
                  Component: (await import('../specifications/pages/specification-page')).SpecificationPage,
                }),
              },
              {
                path: paths.check.pattern,
                lazy: async () => ({ Component: (await import('../checking/pages/check-page')).CheckPage }),
              },
              {
                path: paths.catalogue.pattern,
                lazy: async () => ({ Component: (await import('../catalogue/pages/catalogue-page')).CataloguePage }),
              },
              {
                path: paths.catalogueUnit.pattern,
                lazy: async () => ({
                  Component: (await import('../catalogue/pages/catalogue-unit-page')).CatalogueUnitPage,
                }),
              },
              {
                path: paths.tables.pattern,
                lazy: async () => ({ Component: (await import('../reference/pages/tables-page')).TablesPage }),
              },
              {
                path: paths.table.pattern,
                lazy: async () => ({ Component: (await import('../reference/pages/table-page')).TablePage }),
              },
              {
                path: paths.knownAnswers.pattern,
                lazy: async () => ({
                  Component: (await import('../reference/pages/known-answers-page')).KnownAnswersPage,
                }),
              },
              {
                path: paths.risk.pattern,
                lazy: async () => ({ Component: (await import('../risk/pages/risk-page')).RiskPage }),
              },
              {
                path: paths.trail.pattern,
                lazy: async () => ({ Component: (await import('../trail/pages/trail-page')).TrailPage }),
              },
              {
                path: paths.administration.pattern,
                lazy: async () => ({
                  Component: (await import('../administration/pages/administration-page')).AdministrationPage,
                }),
              },
              {
                path: paths.account.pattern,
                lazy: async () => ({ Component: (await import('../account/pages/account-page')).AccountPage }),
              },
              { path: '*', element: <NotFoundPage /> },
            ],
          },
        ],
      },
    ],
  },
];
