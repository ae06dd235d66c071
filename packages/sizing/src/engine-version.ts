/** Version of the methods, data and rounding behind a result. It is raised whenever a result may change, and stored with every revision. */
export const engineVersion = '1.1.0'
