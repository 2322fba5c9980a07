import type { SignUpRequest } from "@linkwright/contract";
import { type Control, Controller } from "react-hook-form";
import { TextField } from "@/ui/TextField.tsx";

/** The four things asked for. */
export function SignUpFields({ control }: { control: Control<SignUpRequest> }) {
  return (
    <>
      <Controller
        control={control}
        name="name"
        render={({ field, fieldState }) => (
          <TextField {...field} label="Your name" autoComplete="name" error={fieldState.error?.message} />
        )}
      />
      <Controller
        control={control}
        name="workshopName"
        render={({ field, fieldState }) => (
          <TextField
            {...field}
            label="Name of the workshop"
            help="It stands on every sheet that leaves the house."
            autoComplete="organization"
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={control}
        name="email"
        render={({ field, fieldState }) => (
          <TextField
            {...field}
            label="E-mail address"
            type="email"
            autoComplete="username"
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={control}
        name="password"
        render={({ field, fieldState }) => (
          <TextField
            {...field}
            label="Password"
            help="At least 10 characters; a few words in a row are best."
            type="password"
            autoComplete="new-password"
            error={fieldState.error?.message}
          />
        )}
      />
    </>
  );
}
