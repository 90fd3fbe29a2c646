/// <reference types="office-js" />
