import { type ValidationError, ValidationPipe } from '@nestjs/common';
import { type FieldProblem, ProblemException } from './problem';

function flatten(errors: ValidationError[], path: string): FieldProblem[] {
  return errors.flatMap(({ property, constraints, children }) => {
    const pointer = `${path}/${property}`;
    const own = Object.entries(constraints ?? {}).map(([code, message]) => ({
      pointer,
      code,
      message:
        code === 'whitelistValidation'
          ? `“${property}” is not a field that can be set here.`
          : sentence(message),
    }));
    return [...own, ...flatten(children ?? [], pointer)];
  });
}

function sentence(message: string): string {
  const text = message.charAt(0).toUpperCase() + message.slice(1);
  return text.endsWith('.') ? text : `${text}.`;
}

/** Takes only known fields of the right type; everything else is refused at its field. */
export function validationPipe(): ValidationPipe {
  return new ValidationPipe({
    whitelist: true,
    forbidNonWhitelisted: true,
    transform: true,
    exceptionFactory: (errors) => {
      const fields = flatten(errors, '');
      return new ProblemException(
        400,
        'bad-input',
        fields.map(({ message }) => message).join(' '),
        fields,
      );
    },
  });
}
