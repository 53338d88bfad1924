import 'reflect-metadata';
import { Transform, Type } from 'class-transformer';
import {
  IsIn,
  IsInt,
  IsNotEmpty,
  IsOptional,
  IsString,
  IsUrl,
  Matches,
  Max,
  Min,
  MinLength,
  ValidateBy,
  ValidateIf,
} from 'class-validator';

const HOPS_OR_NETWORKS =
  /^(\d{1,2}|[\da-f.:/]+|loopback|linklocal|uniquelocal)(, ?([\da-f.:/]+|loopback|linklocal|uniquelocal))*$/i;

const MAILBOX = /^([^<>"\r\n]+ <[^\s<>@]+@[^\s<>@]+>|[^\s<>@]+@[^\s<>@]+)$/;
const LOOPBACK = /^(localhost|127\..*|\[?::1\]?|0\.0\.0\.0)$/i;

/** Everything that the environment may say: each property is named as its variable. */
export class AppConfig {
  @IsIn(['development', 'test', 'production'])
  NODE_ENV: 'development' | 'test' | 'production' = 'development';

  @IsNotEmpty()
  HOST = '127.0.0.1';

  @Type(() => Number)
  @Max(65535)
  @Min(0)
  @IsInt()
  PORT = 3000;

  /** The address that people open, such as https://noise.example.org; never left out in production: links in e-mails need it. */
  @ValidateIf(isProductionOrGiven('PUBLIC_ORIGIN'))
  @IsUrl({ require_tld: false, require_protocol: true, protocols: ['http', 'https'] })
  @Transform(({ value }) => originOf(value))
  PUBLIC_ORIGIN?: string;

  /** How many proxies stand in front, or their networks; left out = none is trusted. */
  @IsOptional()
  @Matches(HOPS_OR_NETWORKS)
  TRUST_PROXY?: string;

  @IsNotEmpty()
  DB_HOST = '127.0.0.1';

  @Type(() => Number)
  @Max(65535)
  @Min(1)
  @IsInt()
  DB_PORT = 3306;

  @IsNotEmpty()
  DB_USER = 'roothertz';

  @ValidateIf(isProduction)
  @IsNotEmpty()
  DB_PASSWORD = '';

  /** Owns the tables: migrates, and grants DB_USER what the application needs; left out = DB_USER does all. */
  @IsOptional()
  @IsNotEmpty()
  DB_OWNER_USER?: string;

  @IsString()
  DB_OWNER_PASSWORD = '';

  @Matches(/^\w{1,64}$/)
  DB_NAME = 'roothertz';

  /** Signs the sessions; left out = a new one at every start, and never left out in production. */
  @MinLength(32)
  @IsString()
  JWT_SECRET: string;

  /** Where the built pages are; left out = frontend/dist beside the backend. */
  @IsOptional()
  @IsNotEmpty()
  FRONTEND_DIST?: string;

  /** Where uploaded lists stand until they are applied; left out = a folder among the machine's temporary files. */
  @IsOptional()
  @IsNotEmpty()
  IMPORT_DIR?: string;

  /** Where e-mails are handed over; left out = they stay in the outbox, and never left out in production. */
  @ValidateIf(isProductionOrGiven('SMTP_HOST'))
  @IsNotEmpty()
  SMTP_HOST?: string;

  @Type(() => Number)
  @Max(65535)
  @Min(1)
  @IsInt()
  SMTP_PORT = 587;

  @IsOptional()
  @IsNotEmpty()
  SMTP_USER?: string;

  @IsOptional()
  @IsNotEmpty()
  SMTP_PASSWORD?: string;

  /** `true` = TLS from the first byte, as on port 465; otherwise it begins when the server offers it. */
  @IsIn(['true', 'false'])
  SMTP_SECURE: 'true' | 'false' = 'false';

  /** Whom e-mails come from, such as `Roothertz <noise@example.org>`; never left out in production. */
  @Matches(MAILBOX)
  MAIL_FROM: string;

  /** The key of the payment service; left out = nothing can be paid. */
  @NotInProduction(/fake/, 'a key of the payment service itself')
  @IsOptional()
  @IsNotEmpty()
  STRIPE_SECRET_KEY?: string;

  /** What events of the payment service are signed with; never left out where it has a key. */
  @NotInProduction(/fake/, 'a secret of the payment service itself')
  @ValidateIf(({ STRIPE_SECRET_KEY }: AppConfig) => STRIPE_SECRET_KEY !== undefined)
  @IsNotEmpty()
  STRIPE_WEBHOOK_SECRET?: string;

  @NotInProduction(LOOPBACK, 'the payment service itself and no stand-in')
  @IsNotEmpty()
  STRIPE_HOST = 'api.stripe.com';

  @Type(() => Number)
  @Max(65535)
  @Min(1)
  @IsInt()
  STRIPE_PORT = 443;

  @NotInProduction(/^http$/, 'https')
  @IsIn(['http', 'https'])
  STRIPE_PROTOCOL: 'http' | 'https' = 'https';

  /** Finds the price of a seat a month at the payment service. */
  @Matches(/^[\w-]{1,200}$/)
  STRIPE_PRICE_LOOKUP_KEY = 'roothertz_team_seat_month';

  get isProduction(): boolean {
    return isProduction(this);
  }

  /** What the links in e-mails begin with. */
  get origin(): string {
    const host = ['0.0.0.0', '::'].includes(this.HOST) ? 'localhost' : this.HOST;
    return this.PUBLIC_ORIGIN ?? `http://${host.includes(':') ? `[${host}]` : host}:${this.PORT}`;
  }
}

/** Refuses in production what is for trying out only. */
function NotInProduction(refused: RegExp, expected: string): PropertyDecorator {
  const isFine = (value: unknown, config: AppConfig) => !isProduction(config) || !refused.test(String(value));
  return ValidateBy(
    {
      name: 'notInProduction',
      validator: { validate: (value, args) => isFine(value, args?.object as AppConfig) },
    },
    { message: ({ property }) => `${property} must be ${expected} in production` },
  );
}

function isProduction({ NODE_ENV }: AppConfig): boolean {
  return NODE_ENV === 'production';
}

function isProductionOrGiven(name: keyof AppConfig) {
  return (config: AppConfig) => isProduction(config) || config[name] !== undefined;
}

function originOf(value: unknown): unknown {
  return typeof value === 'string' && URL.canParse(value) ? new URL(value).origin : value;
}
