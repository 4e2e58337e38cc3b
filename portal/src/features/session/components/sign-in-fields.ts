export interface SignInFields {
  email: string;
  password: string;
  sharedDevice: boolean;
}
