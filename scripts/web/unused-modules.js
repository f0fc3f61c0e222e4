// What the router, React Native's web version and zod bring along and Thickset does not use: about a third of their weight.
// They load it from their own roots, so leaving it out is the bundler's business. Whoever comes to need one of these takes it off the list;
// until then it fails at once when it is drawn.
const unused = [
  // navigators and screens with a look of their own: Thickset draws its shell around Slot, its own problems and its own "not found"
  'expo-router/build/layouts/(Tabs|experimental-stack|stack-utils)\\b',
  'expo-router/build/(fork/native-stack|split-view|modal|standard-navigation)/',
  'expo-router/build/react-navigation/(bottom-tabs|native-stack|elements|drawer|stack|material-top-tabs)/',
  'expo-router/build/link/preview/(HrefPreview|native)\\b',
  'expo-router/build/views/(Sitemap|Toast|ErrorBoundary|Unmatched)\\.js',
  'react-native-screens/',
  // animation, virtual lists, and controls: the kit has the browser's own
  'react-native-web/dist/exports/(Animated|FlatList|SectionList|VirtualizedList|LayoutAnimation|InteractionManager)/',
  'react-native-web/dist/exports/Touchable(Opacity|Highlight|NativeFeedback)?/',
  'react-native-web/dist/exports/(RefreshControl|ImageBackground|Image|TextInput|Modal|ActivityIndicator)/',
  'react-native-web/dist/exports/(Switch|CheckBox|Picker|ProgressBar|Button|KeyboardAvoidingView|YellowBox|LogBox|Share)/',
  // compiling schemas (the page's policy forbids eval) and JSON schema
  'zod/v4/(classic/from-json-schema|core/json-schema-processors|core/compile)\\.js',
].map((module) => new RegExp(`/node_modules/${module}`));

module.exports = { isUnused: (file) => unused.some((pattern) => pattern.test(file.replaceAll('\\', '/'))) };
