import { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { appHeader, errorResponse, paths } from '@thudline/contracts';
import { cleanupOpenApiDoc, createZodDto } from 'nestjs-zod';

class ErrorResponseDto extends createZodDto(errorResponse) {}

export function openApiDocument(app: NestExpressApplication): OpenAPIObject {
  const description =
    `Writes carry the header ${appHeader.name}: ${appHeader.value} and an Origin equal to the site's address. ` +
    'Every error is { code, message, details? }. `x-access` tells who may call a route.';
  const builder = new DocumentBuilder()
    .setTitle('Thudline')
    .setDescription(description)
    .setVersion('1')
    .addCookieAuth('thudline_access', { type: 'apiKey', in: 'cookie' }, 'access')
    .addGlobalResponse({ status: 'default', description: 'What went wrong.', type: ErrorResponseDto })
    .build();
  return cleanupOpenApiDoc(SwaggerModule.createDocument(app, builder, { extraModels: [ErrorResponseDto] }));
}

export function documentApi(app: NestExpressApplication): void {
  SwaggerModule.setup(paths.docs, app, () => openApiDocument(app), {
    jsonDocumentUrl: `${paths.docs}/openapi.json`,
    raw: ['json'],
    customSiteTitle: 'Thudline API',
    customCss: '.topbar { display: none }',
  });
}
